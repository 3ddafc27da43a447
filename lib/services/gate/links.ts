import { insertGate, lockGate, updateGate } from '@/db/queries/gate';
import { findSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict, notFound } from '@/lib/errors';
import { makeGateInput, revokeGateInput } from '@/lib/schemas/gate';
import { defineWrite } from '../define';

const A_DAY_MS = 86_400_000;

/** Makes the link of a site's parts counter, with which anybody may ask whether a unit is to get another compressor. */
export const makeGate = defineWrite({
  name: 'make.gate',
  doing: 'give out the links of gates',
  roles: PERMITTED['site.manage'],
  input: makeGateInput,
  run: async ({ tx, ctx, input: { id, siteId, name, askWhom, days }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, siteId };
    if (!(await findSite(tx, of))) throw notFound('site');
    const at = ctx.now();
    const written = await insertGate(tx, { ...of, id, name, askWhom, expiresAt: new Date(at.getTime() + days * A_DAY_MS), createdBy: ctx.person.id, createdAt: at });
    if (written) audit({ entity: 'gate', entityId: id, changed: { siteId, name, askWhom, days } });
    else {
      const known = await lockGate(tx, { ...of, gateId: id });
      if (known?.siteId !== siteId) throw conflict('This id belongs to another gate.');
      unchanged();
    }
    return { id, siteId };
  },
});

/** Makes a link worthless, and the codes that were printed of it. */
export const revokeGate = defineWrite({
  name: 'revoke.gate',
  doing: 'give out the links of gates',
  roles: PERMITTED['site.manage'],
  input: revokeGateInput,
  run: async ({ tx, ctx, input: { siteId, gateId }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, gateId };
    const gate = await lockGate(tx, of);
    if (gate?.siteId !== siteId) throw notFound('gate');
    if (gate.revokedAt) unchanged();
    else {
      await updateGate(tx, of, { revokedAt: ctx.now(), revokedBy: ctx.person.id });
      audit({ entity: 'gate', entityId: gateId, changed: { siteId, revoked: true } });
    }
    return { id: gateId, siteId };
  },
});
