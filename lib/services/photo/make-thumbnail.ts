import { asTenant, type Database } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { lockAttachment, selectAttachment, updateAttachment } from '@/db/queries/attachment';
import type { JobData } from '@/lib/jobs';
import type { Storage } from '@/lib/storage';
import { thumbnailKey } from './object-key';
import { THUMBNAIL_TYPE, thumbnailOf } from './picture';

/** Makes the small copy of a stored photo. Run twice, it leaves things as they are. */
export async function makeThumbnail(
  { db, storage, now }: { db: Database; storage: Storage; now: () => Date },
  { organisationId, photoId }: JobData['make-thumbnail'],
): Promise<void> {
  const of = { organisationId, photoId };
  const photo = await asTenant(db, of, (tx) => selectAttachment(tx, of));
  if (photo?.state !== 'stored' || photo.thumbnailKey !== null) return;
  const picture = await storage.get(photo.objectKey);
  if (!picture) throw new Error(`The object of photo ${photoId} is gone`);
  const key = thumbnailKey(organisationId, photoId);
  await storage.put(key, await thumbnailOf(picture), THUMBNAIL_TYPE);
  await asTenant(db, of, async (tx) => {
    if ((await lockAttachment(tx, of))?.thumbnailKey !== null) return;
    await updateAttachment(tx, of, { thumbnailKey: key });
    await insertAudit(tx, [{ organisationId, action: 'make.thumbnail', entity: 'photo', entityId: photoId, changed: { thumbnail: 'made' }, at: now() }]);
  });
}
