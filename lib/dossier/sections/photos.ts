import type { DossierBlock, DossierPhoto } from '@/lib/schemas/dossier-content';
import type { Stroke } from '@/lib/schemas/photo';
import { text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface PhotoPart {
  id: string;
  description: string | null;
  /** The name of the check that it was taken for. */
  checkName: string | null;
  width: number | null;
  height: number | null;
  strokes: Stroke[];
  takenAt: Date;
  person: string;
  objectKey: string;
}

export function photosSection(photos: readonly PhotoPart[], { name, timeZone }: Writer): DossierBlock[] {
  if (photos.length === 0) return text('No photos.');
  const shown = photos.map(({ id, description, checkName, width, height, strokes, takenAt, person, objectKey }): DossierPhoto => ({
    id,
    caption: description ?? '',
    about: [checkName, momentText(takenAt, timeZone), name(person)].filter(Boolean).join(', '),
    width: width ?? 4,
    height: height ?? 3,
    strokes,
    objectKey,
  }));
  return [{ kind: 'photos', photos: shown }];
}
