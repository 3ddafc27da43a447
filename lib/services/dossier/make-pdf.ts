import { createHash } from 'node:crypto';
import { asTenant, type Database } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { insertSeal, lockDossier, selectDossier, updateDossier } from '@/db/queries/dossier';
import type { JobData } from '@/lib/jobs';
import type { Attempt } from '@/lib/jobs/attempt';
import { dossierPdf } from '@/lib/pdf';
import type { DossierContent } from '@/lib/schemas/dossier-content';
import type { Storage } from '@/lib/storage';
import { dossierKey } from './object-key';
import { asPaper } from './view';
import { printCopyOf } from '../photo/picture';

interface Means {
  db: Database;
  storage: Storage;
  now: () => Date;
}

/**
 * Makes the PDF of a dossier from what it says, and nothing of the case as it is now. Run twice it makes the same bytes, so
 * that a worker that is killed leaves nothing that the next can't put right.
 */
export async function makeDossierPdf({ db, storage, now }: Means, { organisationId, dossierId }: JobData['make-dossier'], { isLast }: Pick<Attempt, 'isLast'>): Promise<void> {
  const of = { organisationId, dossierId };
  const row = await asTenant(db, of, (tx) => selectDossier(tx, of));
  if (!row || row.state === 'made') return;
  const { content, contentHash, reference, madeAt } = row;
  try {
    const pictures = await picturesOf(storage, content);
    const pdf = await dossierPdf({ content, contentHash, paper: asPaper(row.paper), madeAt, pictures: (id) => pictures.get(id) });
    const hash = createHash('sha256').update(pdf).digest('hex');
    const key = dossierKey(organisationId, dossierId);
    await storage.put(key, pdf, 'application/pdf');
    await asTenant(db, of, async (tx) => {
      if ((await lockDossier(tx, of))?.state === 'made') return;
      await updateDossier(tx, of, { state: 'made', objectKey: key, bytes: pdf.byteLength, pdfHash: hash, error: null });
      await insertSeal(tx, { ...of, kind: 'pdf', reference, hash, madeAt });
      await insertAudit(tx, [{ organisationId, action: 'make.dossier-pdf', entity: 'dossier', entityId: dossierId, changed: { pdfHash: hash, bytes: pdf.byteLength }, at: now() }]);
    });
  } catch (error) {
    if (isLast) await asTenant(db, of, (tx) => updateDossier(tx, of, { state: 'failed', error: 'The PDF could not be made. What the dossier says is kept; ask for the PDF again.' }));
    throw error;
  }
}

/** Small copies of its photos, made one after another: never more than one original is held at a time. */
async function picturesOf(storage: Storage, { sections }: DossierContent): Promise<ReadonlyMap<string, Buffer>> {
  const photos = sections.flatMap(({ blocks }) => blocks.flatMap((block) => (block.kind === 'photos' ? block.photos : [])));
  const made = new Map<string, Buffer>();
  for (const { id, objectKey } of photos) {
    const original = await storage.get(objectKey);
    if (!original) throw new Error(`The object of photo ${id} is gone`);
    made.set(id, await printCopyOf(original));
  }
  return made;
}
