'use client';

import { useState } from 'react';
import { Button, buttonClass } from '@/components/ui/Button';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { Notice } from '@/components/ui/Notice';
import { addPhotos, type PhotoOwner } from './add-photos';

/** The camera, or files: several at once, each kept on the device before anything else happens. */
export function AddPhotos({ owner, about }: { owner: PhotoOwner; about: string }) {
  const [work, setWork] = useState<{ done: number; of: number } | null>(null);
  const [problems, setProblems] = useState<string[]>([]);

  async function take(files: readonly File[]): Promise<void> {
    if (files.length === 0) return;
    setProblems([]);
    setWork({ done: 0, of: files.length });
    await addPhotos(files, owner, (problem) => {
      setWork((held) => held && { ...held, done: held.done + 1 });
      if (problem) setProblems((held) => [...held, problem]);
    });
    setWork(null);
  }

  return (
    <div className="grid gap-3 print:hidden">
      <div className="flex flex-wrap gap-3">
        <PickButton capture label="Take a photo" about={about} onFiles={take} busy={work !== null} />
        <PickButton label="Choose photos" about={about} onFiles={take} busy={work !== null} />
      </div>
      <LiveRegion visible>{work && (work.of === 1 ? 'Keeping the photo on this device…' : `Keeping photo ${Math.min(work.done + 1, work.of)} of ${work.of} on this device…`)}</LiveRegion>
      {problems.length > 0 && (
        <Notice title={problems.length === 1 ? 'One file was left out' : `${problems.length} files were left out`} actions={<Button variant="quiet" onClick={() => setProblems([])}>All right</Button>}>
          <ul className="grid gap-1">{problems.map((problem, i) => <li key={i}>{problem}</li>)}</ul>
        </Notice>
      )}
    </div>
  );
}

interface PickProps {
  label: string;
  about: string;
  /** Straight from the camera where there is one. */
  capture?: boolean;
  busy: boolean;
  onFiles: (files: readonly File[]) => Promise<void>;
}

/** A file field that looks like a button: a phone's own ways to the camera and the album come with it. */
function PickButton({ label, about, capture = false, busy, onFiles }: PickProps) {
  return (
    <label className={`${buttonClass({ variant: 'quiet' })} cursor-pointer has-[:disabled]:border-dashed has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-ink`}>
      {label}
      <input
        type="file"
        accept="image/*"
        className="sr-only"
        aria-label={`${label}: ${about}`}
        multiple={!capture}
        capture={capture ? 'environment' : undefined}
        disabled={busy}
        onChange={(event) => {
          const files = [...(event.target.files ?? [])];
          // The same file may be chosen once more.
          event.target.value = '';
          void onFiles(files);
        }}
      />
    </label>
  );
}
