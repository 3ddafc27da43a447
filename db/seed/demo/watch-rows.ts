import type { Rulebook } from '@/lib/diagnose/types';
import { planFor } from '@/lib/watch';
import { seededId } from '../seeded-id';
import { audited } from './audit-row';
import type { Random } from './random';
import type { DemoRows, Row } from './rows';

const DAY_MS = 86_400_000;
/** How long ago a repair was called for its watch to have a reading behind it and another before it. */
const OLD_ENOUGH_DAYS = 17;
/** Longer ago somebody would have ended it. */
const TOO_OLD_DAYS = 70;
const WATCHED = 2;
const CHECK = 'oil-amount';
const LINES_AS_THEY_WERE = 'It was sound and its bore was measured in spring';

/**
 * The repairs that are watched today: the latest that were called long enough ago. The first was read once since, so that the
 * next is to come; nobody has read the other, so that it is overdue.
 */
export function watchRows(rows: DemoRows, { proof, checks }: Rulebook, today: Date, random: Random): void {
  const statements = proof?.watch.begin ?? [];
  const isOfThen = (at: Date | undefined) => at !== undefined && at.getTime() < today.getTime() - OLD_ENOUGH_DAYS * DAY_MS && at.getTime() > today.getTime() - TOO_OLD_DAYS * DAY_MS;
  const called = new Map(rows.call.map((row) => [row.caseId, row]));
  const watched = rows.cases.filter(({ id, status }) => status === 'called' && isOfThen(called.get(id)?.at) && called.get(id)?.mainCause !== 'normal-carryover');
  for (const [i, { organisationId, id: caseId, unitId, openedBy: startedBy }] of watched.slice(-WATCHED).reverse().entries()) {
    const call = called.get(caseId);
    const plan = call && planFor(proof, call.mainCause);
    if (!plan || !startedBy || !checks.some(({ id }) => id === CHECK)) continue;
    const id = seededId(`watch ${caseId}`);
    const startedAt = new Date(call.at.getTime() + DAY_MS);
    const begin: Row<'watch'>['begin'] = statements.map((statement, place) => (i > 0 && place === 0 ? { statement, answer: 'not-applicable', why: LINES_AS_THEY_WERE } : { statement, answer: 'yes', why: null }));
    rows.watch.push({ organisationId, id, caseId, unitId, causeId: call.mainCause, plan, begin, startedAt, startedBy, createdAt: startedAt });
    rows.audit.push(audited(random, startedAt, startedBy, { action: 'start.watch', entity: 'watch', entityId: id, changed: { caseId, causeId: call.mainCause, plan: plan.id, begin: begin.map(({ answer }) => answer) } }));
    if (i > 0) continue;
    const at = new Date(today.getTime() - 2 * DAY_MS);
    const shares = [{ state: 'film', share: 1 }];
    rows.watchReading.push({ organisationId, id: seededId(`watch reading ${caseId}`), watchId: id, caseId, checkId: CHECK, kind: 'state', shares, verdict: 'in-order', personId: startedBy, at });
    rows.audit.push(audited(random, at, startedBy, { action: 'add.watch-reading', entity: 'watch', entityId: id, changed: { caseId, checkId: CHECK, shares, verdict: 'in-order' } }));
  }
}
