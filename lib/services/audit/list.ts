import { countAudit, listAudit as selectAudit, listAuditedEntities } from '@/db/queries/audit';
import { listMembers } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { auditQuery } from '@/lib/schemas/person';
import { defineRead } from '../define';

const PAGE = 50;
const DAY_MS = 86_400_000;

/** What was written, by whom and when, the newest first. Days are those of universal time, as the log is. */
export const listAudit = defineRead({
  name: 'list.audit',
  doing: 'see the audit',
  roles: PERMITTED['audit.see'],
  input: auditQuery,
  run: async ({ tx, ctx, input: { person, entity, entityId, from, until, page } }) => {
    const organisationId = ctx.organisation.id;
    const filter = {
      organisationId,
      personId: person,
      entity,
      entityId,
      from: from ? new Date(from) : null,
      until: until ? new Date(new Date(until).getTime() + DAY_MS) : null,
    };
    const total = await countAudit(tx, filter);
    const pageCount = Math.max(1, Math.ceil(total / PAGE));
    const shown = Math.min(page, pageCount);
    return {
      rows: await selectAudit(tx, { ...filter, limit: PAGE, offset: (shown - 1) * PAGE }),
      total,
      page: shown,
      pageCount,
      entities: await listAuditedEntities(tx, { organisationId }),
      people: (await listMembers(tx, { organisationId })).map(({ personId, name }) => ({ id: personId, name })),
    };
  },
});
