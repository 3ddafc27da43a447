'use client';

import { useEffect, useId, useRef, useState, type SyntheticEvent } from 'react';
import { timeText } from '@/components/case/words';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { TextareaField } from '@/components/ui/TextareaField';
import type { Stroke } from '@/lib/schemas/photo';
import { OutOfSight } from './OutOfSight';
import { saveMarks } from './photo-actions';
import { PhotoCanvas } from './PhotoCanvas';
import { useCasePhotos } from './PhotosOfCase';
import { nameOf } from './PhotoTile';
import { standingOf, type ShownPhoto } from './shown';
import { hasRoom } from './strokes';
import { useObjectUrl } from './use-object-url';

/** One photo, large: to look at, to draw and write on, and to hide. */
export default function PhotoDialog({ photo, onClose }: { photo: ShownPhoto; onClose: () => void }) {
  const ofCase = useCasePhotos();
  const dialog = useRef<HTMLDialogElement>(null);
  const headingId = useId();
  const [strokes, setStrokes] = useState<Stroke[]>(photo.strokes);
  const [description, setDescription] = useState(photo.description);
  const [saving, setSaving] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const [leaving, setLeaving] = useState(false);
  const picture = useObjectUrl(photo.here?.picture);
  const thumbnail = useObjectUrl(photo.here?.thumbnail);
  useEffect(() => dialog.current?.showModal(), []);
  if (!ofCase) return null;

  const { timeZone, checkName, readOnly, refresh } = ofCase;
  const canMark = !readOnly && photo.here?.state !== 'refused';
  const about = photo.checkId ? checkName(photo.checkId) : null;
  const changed = description.trim() !== photo.description || JSON.stringify(strokes) !== JSON.stringify(photo.strokes);
  const route = (of: string) => (photo.here ? null : `/api/v1/photos/${photo.id}/${of}`);
  const standing = standingOf(photo, undefined);

  const add = (stroke: Stroke) => {
    if (hasRoom(strokes, stroke.points.length)) setStrokes([...strokes, stroke]);
    else setProblem('No more lines fit on this photo. Clear some of them first.');
  };
  async function save(): Promise<void> {
    setSaving(true);
    setProblem(null);
    try {
      if (await saveMarks(photo, { strokes, description: description.trim() })) await refresh();
      dialog.current?.close();
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'It could not be saved. Try again.');
      setSaving(false);
    }
  }
  const leave = (event?: SyntheticEvent) => {
    event?.preventDefault();
    if (changed && canMark) setLeaving(true);
    else dialog.current?.close();
  };

  return (
    <dialog
      ref={dialog}
      aria-labelledby={headingId}
      onCancel={leave}
      onClose={onClose}
      className="m-auto max-h-dvh w-[min(100vw,60rem)] max-w-none overflow-y-auto border-2 border-ink bg-paper p-4 text-ink backdrop:bg-[#0a1315]/75 sm:p-6"
    >
      <div className="grid gap-4">
        <header className="flex items-start justify-between gap-4">
          <div>
            <h2 id={headingId}>{about ? `Photo: ${about}` : 'Photo'}</h2>
            <p className="text-ink-soft">{timeText(photo.takenAt, timeZone)}{photo.person ? `, ${photo.person}` : ''}</p>
            {standing && <p className="font-bold">{standing}</p>}
          </div>
          <Button variant="quiet" onClick={() => leave()}>Close</Button>
        </header>
        {leaving && (
          <Notice
            title="What you drew or wrote isn’t saved"
            actions={<><Button onClick={() => { setLeaving(false); void save(); }}>Save it</Button><Button variant="quiet" onClick={() => dialog.current?.close()}>Close without it</Button></>}
          >
            Save it, or close the photo as it was.
          </Notice>
        )}
        <PhotoCanvas
          src={photo.here ? picture : route('picture')}
          fallback={photo.here ? thumbnail : route('thumbnail')}
          alt={nameOf(photo, about, timeZone)}
          width={photo.width}
          height={photo.height}
          strokes={strokes}
          onStroke={canMark ? add : null}
        />
        {canMark ? (
          <>
            <div className="flex flex-wrap gap-3">
              <Button variant="quiet" disabled={strokes.length === 0} onClick={() => setStrokes(strokes.slice(0, -1))}>Undo the last line</Button>
              <Button variant="quiet" disabled={strokes.length === 0} onClick={() => setStrokes([])}>Clear all lines</Button>
            </div>
            <TextareaField label="What it shows" name="description" id={`${headingId}-words`} value={description} maxLength={1000} onChange={(event) => setDescription(event.target.value)} error={problem ?? undefined} />
            <div><Button onClick={() => void save()} disabled={saving || !changed}>{saving ? 'Saving…' : 'Save'}</Button></div>
          </>
        ) : (
          photo.description && <p>{photo.description}</p>
        )}
        {!readOnly && <OutOfSight photo={photo} onDone={() => dialog.current?.close()} />}
      </div>
    </dialog>
  );
}
