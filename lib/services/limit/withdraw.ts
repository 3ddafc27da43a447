import { withdrawLimit as withdraw } from '@/db/queries/limit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { withdrawLimitInput } from '@/lib/schemas/limit';
import { defineWrite } from '../define';

/** Takes a limit out of force. What was judged by it still says so. */
export const withdrawLimit = defineWrite({
  name: 'withdraw.limit',
  doing: 'withdraw limits',
  roles: PERMITTED['limit.adopt'],
  input: withdrawLimitInput,
  run: async ({ tx, ctx, input: { limitId, reason }, audit }) => {
    const done = await withdraw(tx, { organisationId: ctx.organisation.id, limitId, at: ctx.now(), by: ctx.person.id, reason });
    if (!done) throw notFound('limit');
    audit({ entity: 'limit', entityId: limitId, changed: { withdrawn: true, reason } });
    return { id: limitId };
  },
});
