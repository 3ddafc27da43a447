import { seededId } from '../seeded-id';
import { DAYS_OF_RECORD } from './calendar';
import { SMALL_HOLE } from './compressor-models';
import { SITES, type Site, type Vocation } from './organisation';
import { randomFrom, type Random } from './random';

export interface Vehicle {
  id: string;
  fleetNumber: string;
  site: Site;
  kind: 'truck' | 'bus';
  vocation: Vocation;
  /** Day of the record; before it negative. */
  builtDay: number;
  /** The day from which the record has it. */
  firstDay: number;
  engineFamily: string;
  /** Compressor models that its engine takes, the one it is built with first. */
  models: readonly string[];
  milesPerDay: number;
  milesPerHour: number;
  /** What makes it worse or better than others of its kind: nobody knows why. Mean about 1. */
  frailty: number;
  reservoirs: string;
  requiredReservoirs: string;
  reservoirCount: number;
  /** The day on which a new odometer was put in. */
  odometerReplacedOn?: number;
  note: string | null;
}

/** Inventions, each with the compressors that bolt to it. */
const ENGINES: Record<string, readonly string[]> = {
  'Harrow 13': [SMALL_HOLE, 'Karda 19'],
  'Harrow 11': ['Karda 19', SMALL_HOLE],
  'Skerry 15': ['Ostrel 18', 'Ostrel 31 twin'],
  'Wrenfield 9': ['Lumo 12', 'Vessen 16'],
  'Tallis 12': ['Vessen 22', 'Vessen 16'],
  'Osmund 8': ['Maddern 27 twin', SMALL_HOLE],
};

interface Kind {
  engines: Record<string, number>;
  milesPerDay: [number, number];
  milesPerHour: [number, number];
  /** Oldest age in years. */
  oldest: number;
  buses: number;
}

const KINDS: Record<Vocation, Kind> = {
  'long-haul': { engines: { 'Harrow 13': 45, 'Skerry 15': 35, 'Tallis 12': 20 }, milesPerDay: [230, 340], milesPerHour: [44, 52], oldest: 7, buses: 0.04 },
  regional: { engines: { 'Harrow 13': 25, 'Harrow 11': 30, 'Tallis 12': 25, 'Wrenfield 9': 20 }, milesPerDay: [120, 210], milesPerHour: [30, 40], oldest: 10, buses: 0.08 },
  'stop-start': { engines: { 'Osmund 8': 50, 'Wrenfield 9': 25, 'Harrow 11': 25 }, milesPerDay: [55, 110], milesPerHour: [12, 18], oldest: 13, buses: 0.75 },
  'air-for-unloading': { engines: { 'Skerry 15': 45, 'Harrow 13': 30, 'Tallis 12': 25 }, milesPerDay: [100, 180], milesPerHour: [25, 34], oldest: 10, buses: 0 },
};

const UNITS_BY_SITE = { quillmere: 44, brackenford: 40, saltmarsh: 38 } as const;
/** Fleet units by their place in the list. */
const ODOMETERS_REPLACED = new Set([17, 63, 101]);
const LATE_ARRIVALS = 0.14;

/** About 120 vehicles at three sites. */
export function makeVehicles(): Vehicle[] {
  const random = randomFrom('demo/vehicles');
  const places = Object.values(SITES).flatMap((site) => Array.from({ length: UNITS_BY_SITE[site.key] }, (_, i) => ({ site, i })));
  return places.map(({ site, i }, n) => makeVehicle(random.fork(`${site.key} ${i}`), site, i, ODOMETERS_REPLACED.has(n)));
}

function makeVehicle(random: Random, site: Site, i: number, odometerReplaced: boolean): Vehicle {
  const vocation = random.weighted(site.vocations);
  const { engines, milesPerDay, milesPerHour, oldest, buses } = KINDS[vocation];
  const kind = random.chance(buses) ? 'bus' : 'truck';
  const engineFamily = random.weighted(engines);
  const arrivesLate = random.chance(LATE_ARRIVALS);
  const builtDay = arrivesLate
    ? random.whole(20, DAYS_OF_RECORD - 200)
    : -Math.round(365 * Math.max(0.3, Math.min(oldest, oldest * (0.15 + 0.75 * random.unit()))));
  const fleetNumber = `${site.letter}-${kind === 'bus' ? 'B' : ''}${101 + i * 3 + random.whole(0, 2)}`;
  const required = random.pick([7400, 8100, 8800, 9600]);
  return {
    id: seededId(`unit: ${fleetNumber}`),
    fleetNumber,
    site,
    kind,
    vocation,
    builtDay,
    firstDay: Math.max(0, builtDay + 12),
    engineFamily,
    models: ENGINES[engineFamily] ?? [],
    milesPerDay: random.between(...milesPerDay),
    milesPerHour: random.between(...milesPerHour),
    frailty: Math.exp(0.5 * random.normal() - 0.125),
    reservoirs: `${grouped(required + 100 * random.whole(0, 14))} in3`,
    requiredReservoirs: `${grouped(required)} in3`,
    reservoirCount: random.pick([3, 3, 3, 4]),
    ...(odometerReplaced && { odometerReplacedOn: random.whole(200, 900) }),
    note: random.chance(0.06) ? random.pick(['Long-distance spare: changes drivers often.', 'Bought used; earlier papers are in the yard office.', 'Stands at weekends with the power take-off running.']) : null,
  };
}

const grouped = (value: number) => value.toLocaleString('en-US');
