import { z } from 'zod';
import { clockOffsetMs, instant, rowId, rulebookId } from './case';
import { MOST_PHOTO_BYTES, MOST_POINTS, MOST_STROKES, PHOTO_TYPES } from './photo-limits';

/** What of a repair or an install record a photo shows. */
const place = z.string().regex(/^(step\/[0-9a-f-]{36}\/\d{1,2}|install\/[a-z0-9-]{1,40})$/, 'This is no place of a repair.');

const description = z.string().trim().max(1000, 'Keep it under 1,000 characters.');

const fraction = z.number().min(0).max(1);

/** A line drawn on a photo: points in fractions of its width and height, so that any size of it can carry them. */
export const stroke = z.strictObject({ points: z.array(z.tuple([fraction, fraction])).min(1).max(MOST_POINTS) });
export type Stroke = z.infer<typeof stroke>;

export const strokes = z
  .array(stroke)
  .max(MOST_STROKES, `Keep it to ${MOST_STROKES} lines.`)
  .refine((lines) => lines.reduce((sum, { points }) => sum + points.length, 0) <= MOST_POINTS, 'These lines are too long to keep. Clear some of them.');

export const addPhotoInput = z.strictObject({
  /** Client-made uuid v7: the photo's id, and the key by which a repeated request is known. */
  id: rowId,
  caseId: rowId,
  /** The check that it was taken for, if any. */
  checkId: rulebookId.nullish(),
  /** The step of a repair, or the point of an install record, that it shows, if any. */
  place: place.nullish(),
  mediaType: z.enum(PHOTO_TYPES, 'A photo is a JPEG, WebP or PNG.'),
  /** Exact length of what will be uploaded. */
  bytes: z.int().min(1).max(MOST_PHOTO_BYTES, `A photo may hold ${MOST_PHOTO_BYTES / 1024 / 1024} MB at most. Make it smaller first.`),
  takenAt: instant,
  clockOffsetMs,
  description: description.default(''),
});

export const photoInput = z.strictObject({ photoId: rowId });
export const photosOfCaseInput = z.strictObject({ caseId: rowId });
export const markPhotoInput = z.strictObject({ photoId: rowId, strokes, description });
export const hidePhotoInput = z.strictObject({
  photoId: rowId,
  hidden: z.boolean(),
  reason: z.string().trim().min(1, 'Say why.').max(500, 'Keep it under 500 characters.'),
});

/** Where a photo stands: `upload` is where its bytes go, as fields of a form that ends with `file`; null when none are wanted. */
export const photoStanding = z.object({
  id: rowId,
  state: z.enum(['awaited', 'stored', 'refused']),
  refusal: z.string().nullable(),
  upload: z.object({ url: z.url(), fields: z.record(z.string(), z.string()) }).nullable(),
});
export type PhotoStanding = z.infer<typeof photoStanding>;

/** A stored photo of a case. Its picture and thumbnail are at `/api/v1/photos/{id}/picture` and `…/thumbnail`. */
export const photoView = z.object({
  id: rowId,
  caseId: rowId,
  checkId: z.string().nullable(),
  place: z.string().nullable(),
  /** In pixels. */
  width: z.int(),
  height: z.int(),
  takenAt: z.iso.datetime(),
  person: z.string(),
  description: z.string(),
  strokes: z.array(stroke),
  /** Taken out of sight, and why; null: in sight. */
  hidden: z.object({ reason: z.string(), person: z.string(), at: z.iso.datetime() }).nullable(),
});
export type PhotoView = z.infer<typeof photoView>;

export const photoList = z.object({ photos: z.array(photoView) });
export type PhotoList = z.infer<typeof photoList>;

export const photoMarks = z.object({ id: rowId, strokes: z.array(stroke), description: z.string() });
export const photoHidden = z.object({ id: rowId, hidden: z.boolean() });
/** What an answer holds that is no JSON. */
export const photoBytes = z.string().meta({ format: 'binary' });
