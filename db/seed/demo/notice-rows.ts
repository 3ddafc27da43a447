import { seededId } from '../seeded-id';
import { DEMO_MANAGER, DEMO_TECHNICIAN, ORGANISATION } from './organisation';
import type { DemoRows } from './rows';

const MOST = 6;

/** What those who sign in to the demo were told of: the cases that a colleague gave them last, the very last not read yet. */
export function noticeRows(rows: DemoRows): void {
  const given = rows.audit
    .flatMap(({ id: key, action, entityId: caseId, personId: by, changed, at }) => (action === 'assign.case' && at ? [{ key, caseId, by, to: changed.assignedTo, at }] : []))
    .sort((a, b) => b.at.getTime() - a.at.getTime() || (a.key < b.key ? -1 : 1));
  for (const { id: personId } of [DEMO_TECHNICIAN, DEMO_MANAGER]) {
    const told = given.filter(({ to, by }) => to === personId && by !== personId).slice(0, MOST);
    for (const [i, { key, caseId, by, at }] of told.entries()) {
      rows.notice.push({ organisationId: ORGANISATION.id, id: seededId(`notice ${key}`, at.getTime()), personId, kind: 'assigned', key, caseId, about: { by }, byMail: 'never', readAt: i === 0 ? null : at, createdAt: at });
    }
  }
}
