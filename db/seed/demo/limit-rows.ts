import { publishedLimit } from '@/lib/air-and-oil/limits';
import { limitsFor, type AdoptedLimit, type Limit } from '@/lib/limits';
import { seededId } from '../seeded-id';
import type { Calendar } from './calendar';
import { DEMO_ENGINEER, ORGANISATION } from './organisation';
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

export const DEMO_LIMITS: readonly AdoptedLimit[] = ADOPTED.map(({ checkId, figure, vehicleKind = null }) => {
  const published = publishedLimit(figure);
  if (!published) throw new Error(`no published figure ${figure}`);
  const { least = null, most = null, below = false, builtFrom = null, source, standing } = published;
  return { id: seededId(`limit ${figure}`), checkId, least, most, below, builtFrom, builtBefore: null, vehicleKind, country: null, modelId: null, source: `${source} (${standing})`, adoptedAt: '' };
});

/** The limits that hold for a vehicle of the demo. */
export const demoLimits = ({ kind, builtDay }: Vehicle, calendar: Calendar): Map<string, Limit> =>
  new Map(
    [...limitsFor(DEMO_LIMITS, { modelId: null, country: ORGANISATION.country, vehicleKind: kind, builtOn: calendar.date(builtDay) })].map(
      ([checkId, { id, least, most, below, source }]) => [checkId, { id, checkId, least, most, below, source }],
    ),
  );

export function limitRows(rows: DemoRows, createdAt: Date): void {
  for (const { least, most, adoptedAt: _, ...limit } of DEMO_LIMITS) {
    rows.adoptedLimit.push({ ...limit, leastSi: least, mostSi: most, asTyped: {}, organisationId: ORGANISATION.id, personId: DEMO_ENGINEER.id, createdAt });
    rows.audit.push({
      organisationId: ORGANISATION.id,
      id: seededId(`audit of limit ${limit.id}`),
      at: createdAt,
      personId: DEMO_ENGINEER.id,
      action: 'adopt.limit',
      entity: 'limit',
      entityId: limit.id,
      changed: { ...limit, leastSi: least, mostSi: most },
    });
  }
}
