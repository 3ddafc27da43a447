import sharp from 'sharp';
import { newId } from '@/lib/ids';
import type { PhotoStanding } from '@/lib/schemas/photo';
import { addPhoto } from '@/lib/services/photo/add';
import { photoArrived } from '@/lib/services/photo/arrived';
import type { Ctx } from '@/lib/services/context';

/** A picture that no coder can make small: every pixel its own. */
export const noise = (width: number, height: number) => sharp({ create: { width, height, channels: 3, background: '#888', noise: { type: 'gaussian', mean: 128, sigma: 60 } } });

/** A plain picture of a few kilobytes. */
export const smallJpeg = (width = 400, height = 300) => noise(width, height).jpeg({ quality: 60 }).toBuffer();

/** As a phone makes it: lying on its side, with the place and the camera in it. */
export const jpegWithPlace = (width = 400, height = 300, quality = 60) =>
  noise(width, height)
    .jpeg({ quality })
    .withMetadata({ orientation: 6 })
    .withExifMerge({
      IFD0: { Make: 'Camera' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 3230/100', GPSLongitudeRef: 'W', GPSLongitude: '0/1 7/1 4366/100' },
    })
    .toBuffer();

interface Announced {
  caseId: string;
  id?: string;
  checkId?: string;
  mediaType?: 'image/jpeg' | 'image/png' | 'image/webp';
  description?: string;
}

export const announce = (ctx: Ctx, bytes: Uint8Array, { caseId, id = newId(), mediaType = 'image/jpeg', ...more }: Announced): Promise<PhotoStanding> =>
  addPhoto({ ctx, input: { id, caseId, mediaType, bytes: bytes.byteLength, takenAt: ctx.now().toISOString(), ...more } });

/** What a browser does with the permission that it was given. */
export async function upload({ upload: to }: Pick<PhotoStanding, 'upload'>, bytes: Uint8Array): Promise<void> {
  if (!to) throw new Error('No upload is wanted');
  const form = new FormData();
  for (const [name, value] of Object.entries(to.fields)) form.append(name, value);
  form.append('file', new Blob([Uint8Array.from(bytes)]));
  const response = await fetch(to.url, { method: 'POST', body: form });
  if (!response.ok) throw new Error(`The storage answered ${response.status}`);
}

/** Announces, uploads and says so. */
export async function send(ctx: Ctx, bytes: Uint8Array, announced: Announced): Promise<PhotoStanding> {
  const standing = await announce(ctx, bytes, announced);
  await upload(standing, bytes);
  return photoArrived({ ctx, input: { photoId: standing.id } });
}
