'use client';

import { timeText } from '@/components/case/words';
import { Marks } from './Marks';
import { standingOf, type ShownPhoto } from './shown';
import { useObjectUrl } from './use-object-url';

interface Props {
  photo: ShownPhoto;
  /** Of the check that it was taken for, where that isn't plain from the place. */
  checkName: string | null;
  timeZone: string;
  share: number | undefined;
  onOpen: () => void;
}

/** What a photo is called for who doesn't see it. */
export function nameOf({ description, takenAt, person }: ShownPhoto, checkName: string | null, timeZone: string): string {
  return `${description || 'Photo'}${checkName ? `, for ${checkName}` : ''}, ${timeText(takenAt, timeZone)}${person ? `, by ${person}` : ''}`;
}

/** A photo in the strip, which opens it. */
export function PhotoTile({ photo, checkName, timeZone, share, onOpen }: Props) {
  const local = useObjectUrl(photo.here?.thumbnail);
  const src = photo.here ? local : `/api/v1/photos/${photo.id}/thumbnail`;
  const standing = standingOf(photo, share);
  const ratio = photo.width / photo.height;
  return (
    <li className="grid content-start gap-1 [--tall:5.5rem] sm:[--tall:7rem]" style={{ width: `min(100%, calc(var(--tall) * ${ratio}))`, minWidth: '3rem' }}>
      <button type="button" onClick={onOpen} className="relative block min-h-touch w-full overflow-hidden rounded border border-edge bg-sunk hover:border-ink" style={{ aspectRatio: `${photo.width} / ${photo.height}` }}>
        {src ? (
          // eslint-disable-next-line @next/next/no-img-element -- streamed through our own route, at the size that is shown
          <img src={src} alt={nameOf(photo, checkName, timeZone)} loading="lazy" className="absolute inset-0 size-full" />
        ) : (
          <span className="sr-only">{nameOf(photo, checkName, timeZone)}</span>
        )}
        <Marks strokes={photo.strokes} thin />
      </button>
      {standing && <p className="text-[0.9375rem] leading-tight">{standing}</p>}
    </li>
  );
}
