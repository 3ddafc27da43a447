import { insertDossier, insertSeal, takeDossierNumber } from '@/db/queries/dossier';
import type { Transaction } from '@/db/connect';
import { siteDay } from '@/lib/case/site-day';
import { contentHash } from '@/lib/dossier/canonical';
import { dossierContent, type LeftOut } from '@/lib/dossier/content';
import { dossierReference } from '@/lib/dossier/reference';
import { conflict, invalid } from '@/lib/errors';
import { MOST_DOSSIER_PHOTOS, type Paper } from '@/lib/schemas/dossier';
import type { DossierContent } from '@/lib/schemas/dossier-content';
import type { Ctx } from '../context';
import { gatherParts } from './gather-parts';

/** What of a context a dossier takes: a seed has no more. */
export type Maker = Pick<Ctx, 'organisation' | 'person' | 'now' | 'jobs'>;

interface Asked {
  id: string;
  caseId: string;
  paper: Paper;
  leftOut: LeftOut;
}

/** Writes down what a dossier says of a case as it stands now, with its hash, and asks for its PDF. */
export async function writeDossier(tx: Transaction, ctx: Maker, { id, caseId, paper, leftOut }: Asked): Promise<{ reference: string; content: DossierContent; hash: string }> {
  const organisationId = ctx.organisation.id;
  const { head, ...parts } = await gatherParts(tx, ctx, caseId);
  const photos = leftOut.sections.includes('photos') ? 0 : parts.photos.filter((photo) => !leftOut.photoIds.includes(photo.id)).length;
  if (photos > MOST_DOSSIER_PHOTOS) throw invalid({ leaveOutPhotos: `A dossier takes ${MOST_DOSSIER_PHOTOS} photos at most, and this would be ${photos}. Leave some out.` });

  const madeAt = ctx.now();
  const number = await takeDossierNumber(tx, organisationId);
  const reference = dossierReference(number, siteDay(madeAt, head.timeZone));
  const about = { reference, organisation: ctx.organisation.name, caseNumber: head.number, madeAt, madeBy: ctx.person.name, timeZone: head.timeZone };
  const content = dossierContent({ about, ...parts }, leftOut);
  const hash = contentHash(content);
  const keptOut = { ...leftOut, sections: [...leftOut.sections], photoIds: [...leftOut.photoIds] };
  const written = await insertDossier(tx, { organisationId, id, caseId, number, reference, madeAt, madeBy: ctx.person.id, paper, leftOut: keptOut, content, contentHash: hash });
  if (!written) throw conflict('This id belongs to another dossier.');
  await insertSeal(tx, { organisationId, dossierId: id, kind: 'content', reference, hash, madeAt });
  await ctx.jobs.send(tx, 'make-dossier', { organisationId, dossierId: id });
  return { reference, content, hash };
}
