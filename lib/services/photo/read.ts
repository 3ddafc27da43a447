import { selectAttachment } from '@/db/queries/attachment';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { photoInput } from '@/lib/schemas/photo';
import { defineRead } from '../define';
import { THUMBNAIL_TYPE, thumbnailOf } from './picture';

export interface PhotoFile {
  mediaType: string;
  open: () => Promise<ReadableStream<Uint8Array> | Uint8Array | undefined>;
}

/** The picture of a stored photo, to be passed on as it comes from storage. */
export const readPicture = defineRead({
  name: 'read.photo',
  doing: 'see photos',
  roles: PERMITTED['case.see'],
  input: photoInput,
  run: async ({ tx, ctx, input }): Promise<PhotoFile> => {
    const { objectKey, mediaType } = await stored(tx, { organisationId: ctx.organisation.id, photoId: input.photoId });
    return { mediaType, open: () => ctx.storage.open(objectKey) };
  },
});

/** Its small copy; made on the spot as long as the worker has not, so that a browser may keep what it gets for good. */
export const readThumbnail = defineRead({
  name: 'read.photo',
  doing: 'see photos',
  roles: PERMITTED['case.see'],
  input: photoInput,
  run: async ({ tx, ctx, input }): Promise<PhotoFile> => {
    const { objectKey, thumbnailKey } = await stored(tx, { organisationId: ctx.organisation.id, photoId: input.photoId });
    const made = async () => {
      const picture = await ctx.storage.get(objectKey);
      return picture && thumbnailOf(picture);
    };
    return { mediaType: THUMBNAIL_TYPE, open: thumbnailKey ? () => ctx.storage.open(thumbnailKey) : made };
  },
});

async function stored(...[tx, of]: Parameters<typeof selectAttachment>) {
  const photo = await selectAttachment(tx, of);
  if (photo?.state !== 'stored') throw notFound('photo');
  return photo;
}
