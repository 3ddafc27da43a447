import type { Transaction } from '@/db/connect';
import { lockGate, lockPassage, type GatePassageRow, type GateRow } from '@/db/queries/gate';
import { findOrganisation } from '@/db/queries/organisation';
import { findSite } from '@/db/queries/site';
import { readGateToken, type GateToken } from '@/lib/auth/gate-token';
import type { Writing } from '@/lib/bench/read-texts';
import { conflict } from '@/lib/errors';
import type { Visitor } from '../context';
import { deadLink, throughSignedLink } from '../signed-visit';
import { decimalMarkOf, unitsOfCountry } from '../units-of-measure';

const NOT_OURS = 'This is not one of our links: ask whoever gave it to you for a new one.';

/** A passage is of one visit to the counter: what was asked the day before is asked anew. */
const A_DAY_MS = 86_400_000;

export interface Opened {
  gate: GateRow;
  site: { id: string; name: string; timeZone: string };
  organisation: { id: string; name: string; labourRatePerHour: number | null };
  /** How measures are written here. */
  writing: Writing;
  at: Date;
}

/** Does something with what a gate's link opens; a link that leads nowhere is refused with one sentence. */
export const throughGate = <Result>(visitor: Visitor, token: string, work: (tx: Transaction, opened: Opened) => Promise<Result>): Promise<Result> =>
  throughSignedLink(visitor, { token, read: readGateToken, limit: 'gate by network', notOurs: NOT_OURS }, async (tx, said) => work(tx, await open(tx, said, visitor.now())));

async function open(tx: Transaction, { organisationId, gateId, siteId, expiresAt }: GateToken, at: Date): Promise<Opened> {
  const gate = await lockGate(tx, { organisationId, gateId });
  if (gate?.siteId !== siteId || gate.expiresAt.getTime() !== expiresAt) throw deadLink(NOT_OURS);
  if (gate.revokedAt) throw deadLink('This link was taken back by whoever gave it out.');
  if (gate.expiresAt <= at) throw deadLink('This link has run out: ask whoever gave it to you for a new one.');
  const [site, organisation] = [await findSite(tx, { organisationId, siteId }), await findOrganisation(tx, { organisationId })];
  if (!site || !organisation) throw deadLink(NOT_OURS);
  return { gate, site, organisation: { id: organisationId, ...organisation }, writing: { units: unitsOfCountry(organisation.country), decimal: decimalMarkOf(organisation.country) }, at };
}

/** A passage of a gate, locked, with its unit's number; undefined: another gate's, none at all, or too old. */
export async function passageOf(tx: Transaction, { gate, at }: Opened, passageId: string): Promise<{ passage: GatePassageRow; fleetNumber: string } | undefined> {
  const found = await lockPassage(tx, { organisationId: gate.organisationId, passageId });
  if (found?.passage.gateId !== gate.id || at.getTime() - found.passage.startedAt.getTime() > A_DAY_MS) return undefined;
  return found;
}

export const takenPassage = () => conflict('This page is of another unit by now. Open the link again.');
