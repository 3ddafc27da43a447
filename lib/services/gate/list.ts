import type { GateRow } from '@/db/queries/gate';
import { selectGates } from '@/db/queries/gate';
import { findSite } from '@/db/queries/site';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { listGatesInput, viewGateInput } from '@/lib/schemas/gate';
import { defineRead } from '../define';
import { gatePath } from './path';

const stateOf = ({ revokedAt, expiresAt }: GateRow, now: Date): 'open' | 'revoked' | 'expired' => (revokedAt ? 'revoked' : expiresAt <= now ? 'expired' : 'open');

/** The gates of a site, the latest first, each with where its link leads while it works. */
export const listGates = defineRead({
  name: 'list.gate',
  doing: 'see the links of gates',
  roles: PERMITTED['site.manage'],
  input: listGatesInput,
  run: async ({ tx, ctx, input: { siteId } }) => {
    const of = { organisationId: ctx.organisation.id, siteId };
    const site = await findSite(tx, of);
    if (!site) throw notFound('site');
    const gates = (await selectGates(tx, of)).map(({ row, createdBy, passages }) => {
      const state = stateOf(row, ctx.now());
      return {
        id: row.id,
        name: row.name,
        askWhom: row.askWhom,
        createdBy,
        createdAt: row.createdAt.toISOString(),
        expiresAt: row.expiresAt.toISOString(),
        state,
        passages,
        /** null: it leads nowhere any more. */
        path: state === 'open' ? gatePath(ctx.signingSecret, row) : null,
      };
    });
    return { site, gates };
  },
});

/** One of them that works, for printing its code. */
export const viewGate = defineRead({
  name: 'view.gate',
  doing: 'see the links of gates',
  roles: PERMITTED['site.manage'],
  input: viewGateInput,
  run: async ({ tx, ctx, input: { siteId, gateId } }) => {
    const of = { organisationId: ctx.organisation.id, siteId };
    const site = await findSite(tx, of);
    const row = (await selectGates(tx, of)).find(({ row: { id } }) => id === gateId)?.row;
    if (!site || !row || stateOf(row, ctx.now()) !== 'open') throw notFound('gate');
    return { site, name: row.name, askWhom: row.askWhom, expiresAt: row.expiresAt.toISOString(), path: gatePath(ctx.signingSecret, row) };
  },
});
