import { selectAttachment } from '@/db/queries/attachment';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { photoInput } from '@/lib/schemas/photo';
import { defineRead } from '../define';
import { THUMBNAIL_TYPE } from './picture';

export interface PhotoFile {
  mediaType: string;
  /** It will be the same for good. */
  final: boolean;
  open: () => Promise<ReadableStream<Uint8Array> | undefined>;
}

/** The picture of a stored photo, to be passed on as it comes from storage. */
export const readPicture = defineRead({
  name: 'read.photo',
  doing: 'see photos',
  roles: PERMITTED['case.see'],
  input: photoInput,
  run: async ({ tx, ctx, input }): Promise<PhotoFile> => {
    const { objectKey, mediaType } = await stored(tx, { organisationId: ctx.organisation.id, photoId: input.photoId });
    return { mediaType, final: true, open: () => ctx.storage.open(objectKey) };
  },
});

/** Its small copy, or the picture itself as long as there is none. */
export const readThumbnail = defineRead({
  name: 'read.photo',
  doing: 'see photos',
  roles: PERMITTED['case.see'],
  input: photoInput,
  run: async ({ tx, ctx, input }): Promise<PhotoFile> => {
    const { objectKey, mediaType, thumbnailKey } = await stored(tx, { organisationId: ctx.organisation.id, photoId: input.photoId });
    return thumbnailKey
      ? { mediaType: THUMBNAIL_TYPE, final: true, open: () => ctx.storage.open(thumbnailKey) }
      : { mediaType, final: false, open: () => ctx.storage.open(objectKey) };
  },
});

async function stored(...[tx, of]: Parameters<typeof selectAttachment>) {
  const photo = await selectAttachment(tx, of);
  if (photo?.state !== 'stored') throw notFound('photo');
  return photo;
}
