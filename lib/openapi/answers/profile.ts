import { z } from 'zod';
import { ROLES } from '@/lib/auth/roles';
import { id } from './common';

export const profileAnswer = z
  .object({
    person: z.object({ id, name: z.string(), email: z.string(), siteId: id.nullable() }),
    organisation: z.object({ id, name: z.string(), country: z.string(), currency: z.string() }),
    roles: z.array(z.enum(ROLES)),
    mayRelease: z.boolean(),
    units: z.record(z.string(), z.string()).meta({ description: 'The unit that each quantity is shown in, and taken to be in when none is typed.' }),
  })
  .meta({ id: 'Profile' });
