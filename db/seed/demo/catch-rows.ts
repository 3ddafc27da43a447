import type { CompiledRulebook } from '@/lib/diagnose';
import { seededId } from '../seeded-id';
import { audited } from './audit-row';
import type { Random } from './random';
import type { DemoRows, Row } from './rows';

const CHECK = 'oil-caught';
/** Bottles that a shop of this size has. */
const BOTTLES = 2;

/** The bottles that hang today, on the latest open cases whose oil nobody has caught yet: weighed by nobody until now. */
export function catchRows(rows: DemoRows, { checks }: CompiledRulebook, random: Random): void {
  if (!checks.has(CHECK)) return;
  const caught = new Set(rows.finding.filter(({ checkId }) => checkId === CHECK).map(({ caseId }) => caseId));
  const open = rows.cases.filter(({ id, status }) => status === 'open' && !caught.has(id)).slice(-BOTTLES);
  for (const { organisationId, id: caseId, openedBy, engineS, asTyped } of open) {
    const last = rows.finding.filter((finding) => finding.caseId === caseId).at(-1);
    if (!last || !openedBy) continue;
    const id = seededId(`catch ${caseId}`);
    const row: Row<'oilCatch'> = { organisationId, id, caseId, checkId: CHECK, stage: { kind: 'diagnosis' }, startedAt: last.receivedAt, startedBy: openedBy, engineS, asTyped: asTyped?.engineS ? { engineS: asTyped.engineS } : {}, place: 'at the purge outlet', createdAt: last.receivedAt };
    rows.oilCatch.push(row);
    rows.audit.push(audited(random, last.receivedAt, openedBy, { action: 'start.oil-catch', entity: 'oil-catch', entityId: id, changed: { caseId, checkId: CHECK, engineS, place: row.place } }));
  }
}
