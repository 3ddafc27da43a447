import { and, desc, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/connect';
import { insertAudit } from '@/db/queries/audit';
import { insertClaim } from '@/db/queries/claim';
import { cases } from '@/db/schema';
import { jobs } from '@/lib/jobs';
import { writeDossier, type Maker } from '@/lib/services/dossier/write';
import { US_UNITS } from '@/lib/units';
import { seededId } from '../seeded-id';
import { DAYS_OF_RECORD, type Calendar } from './calendar';
import { DEMO_TECHNICIAN, ORGANISATION } from './organisation';

const AN_HOUR_MS = 3_600_000;

/**
 * A dossier of the newest case that was called, and what was claimed with it: the one thing of the demo that the service
 * itself writes, because what it says is made from the whole case. The worker makes its PDF after the seed.
 */
export async function writePaper(tx: Transaction, calendar: Calendar): Promise<void> {
  const [called] = await tx.select({ id: cases.id }).from(cases).where(and(eq(cases.organisationId, ORGANISATION.id), eq(cases.status, 'called'))).orderBy(desc(cases.number)).limit(1);
  if (!called) return;
  const { id: personId, name, email } = DEMO_TECHNICIAN;
  // The last evening of the demo.
  const at = new Date(calendar.at(DAYS_OF_RECORD, 0, 'UTC').getTime() - AN_HOUR_MS);
  const maker: Maker = { organisation: ORGANISATION, person: { id: personId, name, email, units: US_UNITS, siteId: null }, now: () => at, jobs };
  const [dossierId, claimId] = [seededId('dossier 1'), seededId('claim 1')];
  const of = { organisationId: ORGANISATION.id, caseId: called.id };
  const { reference, content, hash } = await writeDossier(tx, maker, { id: dossierId, caseId: called.id, paper: 'letter', leftOut: { sections: [], photoIds: [], names: true, fleet: false } });
  const claimed = { toWhom: 'Warranty desk', theirReference: 'RMA 20418', sentOn: at.toISOString().slice(0, 10), amount: 612.5 };
  await insertClaim(tx, { ...of, id: claimId, ...claimed, createdBy: personId });
  await insertAudit(tx, [
    { ...of, personId, action: 'make.dossier', entity: 'dossier', entityId: dossierId, changed: { caseId: called.id, reference, paper: 'letter', contentHash: hash, leftOut: content.leftOut }, at },
    { ...of, personId, action: 'file.claim', entity: 'claim', entityId: claimId, changed: { caseId: called.id, ...claimed }, at },
  ]);
}
