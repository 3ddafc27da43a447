import { z } from 'zod';
import { raiseSessionVersion } from '@/db/queries/sign-in';
import { PERMITTED } from '@/lib/auth/permissions';
import { defineWrite } from '../define';

/** Ends every session of one's own, on every device, this one included. */
export const signOutEverywhere = defineWrite({
  name: 'sign-out-everywhere.person',
  doing: 'sign out everywhere',
  roles: PERMITTED['own-settings'],
  input: z.object({}),
  run: async ({ tx, ctx, audit }) => {
    await raiseSessionVersion(tx, ctx.person.id);
    audit({ entity: 'person', entityId: ctx.person.id, changed: { sessions: 'ended' } });
  },
});
