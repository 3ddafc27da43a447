import { z } from 'zod';
import { findPerson } from '@/db/queries/person';
import { organisationsOf } from '@/db/queries/sign-in';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { defineRead } from '../define';

/** Oneself: name, address, units, and the organisations that one can change to. */
export const profile = defineRead({
  name: 'see.profile',
  doing: 'see your own settings',
  roles: PERMITTED['own-settings'],
  input: z.object({}),
  run: async ({ tx, ctx }) => {
    const person = await findPerson(tx, { personId: ctx.person.id });
    if (!person) throw notFound('person');
    return { ...person, units: ctx.person.units, organisations: await organisationsOf(tx, ctx.person.id) };
  },
});
