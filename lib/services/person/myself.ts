import { z } from 'zod';
import { PERMITTED } from '@/lib/auth/permissions';
import { defineRead } from '../define';

/** Who asks, where, as what, and in which units. */
export const myself = defineRead({
  name: 'see.myself',
  doing: 'see your own settings',
  roles: PERMITTED['own-settings'],
  input: z.strictObject({}),
  run: async ({ ctx: { person, organisation, roles, mayRelease } }) => {
    const { units, ...who } = person;
    return { person: who, organisation, roles, mayRelease, units };
  },
});
