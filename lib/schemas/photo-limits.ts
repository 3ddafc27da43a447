/** What a photo may hold, apart from its schemas: a page reads these, and needs no Zod for it. */

/** A resized picture is well under it; an original from a phone often is not. */
export const MOST_PHOTO_BYTES = 4 * 1024 * 1024;
export const PHOTO_TYPES = ['image/jpeg', 'image/webp', 'image/png'] as const;
/** The long side of a picture as a device sends it, in pixels. */
export const LONGEST_SIDE_PX = 2048;
export const MOST_STROKES = 100;
/** Of all strokes together: more than a hand draws, and well within a request. */
export const MOST_POINTS = 6000;
