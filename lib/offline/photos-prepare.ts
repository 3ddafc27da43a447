import { LONGEST_SIDE_PX, MOST_PHOTO_BYTES } from '@/lib/schemas/photo-limits';

/** Why a file is no photo for us, in a sentence for whoever chose it. */
export class PhotoProblem extends Error {}

export interface PreparedPhoto {
  picture: Blob;
  thumbnail: Blob;
  width: number;
  height: number;
}

const THUMBNAIL_PX = 320;
/** The first that comes out small enough; a second is hardly ever needed. */
const QUALITIES = [0.82, 0.6, 0.4];

/**
 * Makes of what a camera or a folder gave what we send: upright, small enough, and nothing in it but the picture. Drawn
 * anew, it holds neither the place nor anything else that a camera writes beside it.
 *
 * @throws PhotoProblem
 */
export async function preparePhoto(file: File): Promise<PreparedPhoto> {
  const original = await decoded(file);
  const small = await resized(original, LONGEST_SIDE_PX).finally(() => original.close());
  try {
    const { width, height } = small;
    const picture = await encoded(small);
    if (!picture) throw new PhotoProblem(`“${file.name}” could not be made small enough to send. It was left out.`);
    const tiny = await resized(small, THUMBNAIL_PX);
    const thumbnail = (await encoded(tiny)) ?? picture;
    tiny.close();
    return { picture, thumbnail, width, height };
  } finally {
    small.close();
  }
}

async function decoded(file: File): Promise<ImageBitmap> {
  try {
    // By what is in it, whatever it is called; and turned as it was held.
    return await createImageBitmap(file, { imageOrientation: 'from-image' });
  } catch {
    if (await isHeif(file)) {
      throw new PhotoProblem(`“${file.name}” is an HEIC picture, which this browser can’t read. Set the camera to JPEG (often called “most compatible”), or take the photo from here.`);
    }
    throw new PhotoProblem(`“${file.name}” can’t be read as a picture, so it was left out.`);
  }
}

/** What several makers' phones write by default: a box "ftyp" of one of these brands at the beginning. */
async function isHeif(file: File): Promise<boolean> {
  const start = new TextDecoder('latin1').decode(await file.slice(4, 12).arrayBuffer());
  return /^ftyp(heic|heix|hevc|heim|heis|mif1|msf1)$/.test(start);
}

function resized(bitmap: ImageBitmap, longest: number): Promise<ImageBitmap> {
  const scale = Math.min(1, longest / Math.max(bitmap.width, bitmap.height));
  const side = (px: number) => Math.max(1, Math.round(px * scale));
  return createImageBitmap(bitmap, { resizeWidth: side(bitmap.width), resizeHeight: side(bitmap.height), resizeQuality: 'high' });
}

async function encoded(bitmap: ImageBitmap): Promise<Blob | undefined> {
  const canvas = new OffscreenCanvas(bitmap.width, bitmap.height);
  const context = canvas.getContext('2d');
  if (!context) return undefined;
  // What a picture leaves transparent would come out black.
  context.fillStyle = '#fff';
  context.fillRect(0, 0, bitmap.width, bitmap.height);
  context.drawImage(bitmap, 0, 0);
  for (const quality of QUALITIES) {
    const blob = await canvas.convertToBlob({ type: 'image/jpeg', quality });
    if (blob.size <= MOST_PHOTO_BYTES) return blob;
  }
  return undefined;
}
