import { publishedLimit } from '@/lib/air-and-oil/limits';
import { limitOf, limitsFor, type Limit } from '@/lib/limits';
import { seededId } from '../seeded-id';
import { audited } from './audit-row';
import type { Calendar } from './calendar';
import { DEMO_ENGINEER, ORGANISATION } from './organisation';
import type { Random } from './random';
import type { DemoRows } from './rows';
import type { Vehicle } from './vehicles';

/** What the demo's engineer adopted when the record began: published figures, for the vehicles that each is for. */
const ADOPTED: readonly { checkId: string; figure: string; vehicleKind?: 'truck' | 'bus' }[] = [
  { checkId: 'build-up-time', figure: 'us-build-up-dual' },
  { checkId: 'leak-down-released', figure: 'us-leak-released-single' },
  { checkId: 'leak-down-applied', figure: 'us-leak-applied-single' },
  { checkId: 'cut-in-pressure', figure: 'us-cut-in-truck', vehicleKind: 'truck' },
  { checkId: 'cut-in-pressure', figure: 'us-cut-in-bus', vehicleKind: 'bus' },
];

const DEMO_LIMITS = ADOPTED.map(({ checkId, figure, vehicleKind = null }) => {
  const published = publishedLimit(figure);
  if (!published) throw new Error(`no published figure ${figure}`);
  return { ...limitOf(published), id: seededId(`limit ${figure}`), checkId, vehicleKind, builtFrom: published.builtFrom ?? null, builtBefore: null, country: null, modelId: null };
});

/** The limits that hold for a vehicle of the demo. */
export const demoLimits = ({ kind, builtDay }: Vehicle, calendar: Calendar): Map<string, Limit> =>
  limitsFor(
    DEMO_LIMITS.map((limit) => ({ ...limit, adoptedAt: calendar.at(0, 0, 'UTC') })),
    { modelId: null, country: ORGANISATION.country, vehicleKind: kind, builtOn: calendar.date(builtDay) },
  );

export function limitRows(rows: DemoRows, createdAt: Date, random: Random): void {
  for (const { least: leastSi, most: mostSi, ...limit } of DEMO_LIMITS) {
    const changed = { ...limit, leastSi, mostSi, asTyped: {} };
    rows.adoptedLimit.push({ ...changed, organisationId: ORGANISATION.id, personId: DEMO_ENGINEER.id, createdAt });
    rows.audit.push(audited(random, createdAt, DEMO_ENGINEER.id, { action: 'adopt.limit', entity: 'limit', entityId: limit.id, changed }));
  }
}
