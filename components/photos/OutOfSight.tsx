'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/Button';
import { TextField } from '@/components/ui/TextField';
import { dropHere, setHidden, tryAgain } from './photo-actions';
import { useCasePhotos } from './PhotosOfCase';
import type { ShownPhoto } from './shown';

/** Takes a photo out of sight: a stored one with a reason that stays, one that only waits here for good. */
export function OutOfSight({ photo, onDone }: { photo: ShownPhoto; onDone: () => void }) {
  return photo.here && photo.here.state !== 'stored' ? <OnlyHere photo={photo} onDone={onDone} /> : <Stored photo={photo} onDone={onDone} />;
}

function OnlyHere({ photo, onDone }: { photo: ShownPhoto; onDone: () => void }) {
  const refused = photo.here?.state === 'refused';
  const then = (work: Promise<unknown>) => void work.then(onDone);
  return (
    <details className="disclosure border-t border-rule pt-2" open={refused}>
      <summary className="min-h-touch py-2 font-bold">{refused ? 'What to do with it' : 'Don’t send it'}</summary>
      <p className="mb-3">This photo is on this device alone. Removed from here, it is gone.</p>
      <div className="flex flex-wrap gap-3">
        {refused && <Button onClick={() => then(tryAgain(photo))}>Send it again</Button>}
        <Button variant="quiet" onClick={() => then(dropHere(photo))}>Remove it from this device</Button>
      </div>
    </details>
  );
}

function Stored({ photo, onDone }: { photo: ShownPhoto; onDone: () => void }) {
  const ofCase = useCasePhotos();
  const [problem, setProblem] = useState<string | undefined>();
  const isHidden = photo.hidden !== null;
  async function submit(event: FormEvent<HTMLFormElement>): Promise<void> {
    event.preventDefault();
    try {
      await setHidden(photo, !isHidden, String(new FormData(event.currentTarget).get('reason') ?? ''));
      await ofCase?.refresh();
      onDone();
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'That could not be done. Try again.');
    }
  }
  return (
    <details className="disclosure border-t border-rule pt-2" open={isHidden}>
      <summary className="min-h-touch py-2 font-bold">{isHidden ? 'Hidden' : 'Hide this photo'}</summary>
      {photo.hidden && <p className="mb-3">Hidden by {photo.hidden.person}: “{photo.hidden.reason}”</p>}
      <form method="post" onSubmit={(event) => void submit(event)} className="grid max-w-prose gap-3">
        <TextField label={isHidden ? 'Why show it again?' : 'Why hide it?'} name="reason" id={`reason-${photo.id}`} hint="Nothing is deleted: the reason stays with it." maxLength={500} required error={problem} />
        <div><Button type="submit" variant="quiet">{isHidden ? 'Show it again' : 'Hide it'}</Button></div>
      </form>
    </details>
  );
}
