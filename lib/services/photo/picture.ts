import sharp from 'sharp';
import { type PHOTO_TYPES } from '@/lib/schemas/photo-limits';

/** An original from a phone has a third of it; a bomb unfolds to a thousand times as much. */
const MOST_PIXELS = 60_000_000;
const THUMBNAIL_PX = 320;
const REWRITTEN_QUALITY = 85;

const FORMATS: Record<string, string> = { jpeg: 'image/jpeg', webp: 'image/webp', png: 'image/png' } satisfies Record<string, (typeof PHOTO_TYPES)[number]>;

// No other decoder of the library is of any use here: what isn't one of these three is no photo.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({ operation: ['VipsForeignLoadJpegBuffer', 'VipsForeignLoadPngBuffer', 'VipsForeignLoadWebpBuffer'] });

export type Looked = { ok: true; body: Uint8Array; width: number; height: number } | { ok: false; why: string };

const open = (bytes: Uint8Array) => sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error', sequentialRead: true });

/**
 * Decodes what was uploaded, to the last pixel, and gives back what may be kept: upright and without anything but the
 * picture. A camera writes the place into its files; who passes a photo on shall not pass on where a vehicle stood.
 *
 * @param bytes as they arrived
 * @param mediaType what they were announced as
 */
export async function lookAt(bytes: Uint8Array, mediaType: string): Promise<Looked> {
  try {
    const { format, width, height, orientation = 1, ...about } = await open(bytes).metadata();
    const isType = FORMATS[format];
    if (isType === undefined) return refused('This is not a JPEG, WebP or PNG picture.');
    if (isType !== mediaType) return refused(`This was announced as ${mediaType} and is ${isType}.`);
    if (width * height > MOST_PIXELS) return refused(tooMany());
    if (about.exif || about.xmp || about.iptc || orientation !== 1 || saysMore(bytes)) {
      const { data, info } = await open(bytes).autoOrient().keepIccProfile().toFormat(format, { quality: REWRITTEN_QUALITY }).toBuffer({ resolveWithObject: true });
      return { ok: true, body: data, width: info.width, height: info.height };
    }
    await open(bytes).stats();
    return { ok: true, body: bytes, width, height };
  } catch (error) {
    return refused(error instanceof Error && /pixel limit/i.test(error.message) ? tooMany() : 'This is no picture, or it is damaged.');
  }
}

const refused = (why: string): Looked => ({ ok: false, why });
const tooMany = () => `This picture has more than ${MOST_PIXELS / 1_000_000} million pixels. Make it smaller first.`;

/** Begin what cameras and programs write beside the picture: places, times, names, further pictures. */
const MARKS = ['Exif\0', 'http://ns.adobe.com/', 'Photoshop 3.0', 'MPF\0', 'eXIf', 'tEXt', 'iTXt', 'zTXt', 'EXIF', 'XMP '];

/** Looked for anywhere, what follows the picture included. One found by chance costs a rewriting, and harms nothing. */
function saysMore(bytes: Uint8Array): boolean {
  const buffer = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  return MARKS.some((mark) => buffer.includes(mark, 0, 'latin1'));
}

export const THUMBNAIL_TYPE = 'image/webp';

/** A small copy for lists. */
export const thumbnailOf = (bytes: Uint8Array): Promise<Uint8Array> =>
  open(bytes).autoOrient().resize(THUMBNAIL_PX, THUMBNAIL_PX, { fit: 'inside', withoutEnlargement: true }).webp({ quality: 78 }).toBuffer();

const PRINT_PX = 1000;

/** A copy to be printed at half the width of a page: a JPEG, because a document takes it as it is. */
export const printCopyOf = (bytes: Uint8Array): Promise<Buffer> =>
  open(bytes).autoOrient().resize(PRINT_PX, PRINT_PX, { fit: 'inside', withoutEnlargement: true }).flatten({ background: '#ffffff' }).jpeg({ quality: 72 }).toBuffer();
