'use client';

import { lazy, Suspense, useState, useSyncExternalStore } from 'react';
import { onProgress, progressAtFirst, readProgress } from '@/lib/offline/photos-progress';
import { AddPhotos } from './AddPhotos';
import { loadDialog } from './load-dialog';
import { PhotoTile } from './PhotoTile';
import { useCasePhotos } from './PhotosOfCase';

const PhotoDialog = lazy(loadDialog);

interface Props {
  checkId?: string | null;
  /** The step or point that they show, and its name. */
  place?: { id: string; name: string } | null;
}

/** Photos of a check, of a step of a repair, or all of the case, and the ways to add one. Has to stand within `PhotosOfCase`. */
export function PhotoStrip({ checkId = null, place = null }: Props) {
  const ofCase = useCasePhotos();
  const progress = useSyncExternalStore(onProgress, readProgress, progressAtFirst);
  const [openId, setOpenId] = useState<string | null>(null);
  if (!ofCase) return null;

  const { caseId, reader, timeZone, checkName, photos, readOnly } = ofCase;
  const ofWhole = checkId === null && place === null;
  const all = photos.filter((photo) => (checkId === null || photo.checkId === checkId) && (place === null || photo.place === place.id));
  const inSight = all.filter(({ hidden }) => hidden === null);
  const outOfSight = all.filter(({ hidden }) => hidden !== null);
  const open = all.find(({ id }) => id === openId);
  const about = place?.name ?? (checkId ? checkName(checkId) : 'of the whole case');
  const label = ofWhole ? 'photos' : `photos-${place?.id ?? checkId}`;
  const tiles = (some: typeof all) => (
    <ul className="flex flex-wrap items-start gap-3">
      {some.map((photo) => (
        <PhotoTile
          key={photo.id}
          photo={photo}
          checkName={ofWhole && photo.checkId ? checkName(photo.checkId) : null}
          timeZone={timeZone}
          share={progress.get(photo.id)}
          onOpen={() => setOpenId(photo.id)}
        />
      ))}
    </ul>
  );

  if (readOnly && all.length === 0) return null;
  return (
    <section aria-labelledby={label} className="grid gap-3">
      {ofWhole ? <h2 id={label}>Photos</h2> : <h3 id={label} className="sr-only">Photos{place ? `: ${place.name}` : ' of this check'}</h3>}
      {inSight.length > 0 && tiles(inSight)}
      {!readOnly && <AddPhotos owner={{ ...reader, caseId, checkId, place: place?.id ?? null }} about={about} />}
      {ofWhole && outOfSight.length > 0 && (
        <details className="disclosure">
          <summary className="min-h-touch py-2 font-bold">{outOfSight.length} hidden</summary>
          {tiles(outOfSight)}
        </details>
      )}
      {open && (
        <Suspense fallback={null}>
          <PhotoDialog key={open.id} photo={open} onClose={() => setOpenId(null)} />
        </Suspense>
      )}
    </section>
  );
}
