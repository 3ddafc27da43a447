import { figureOf, type ConditionId, type FigureId } from '@/lib/baseline/figures';
import type { Conditions, Occasion } from '@/lib/baseline/set';
import { newId } from '@/lib/ids';
import { CONDITION_MEASURES } from '@/lib/schemas/baseline';
import { readFigures } from '@/lib/services/baseline/read-figures';
import { readMeasures } from '@/lib/services/units-of-measure';
import { audited } from './audit-row';
import { DAYS_OF_RECORD } from './calendar';
import { DEMO_MANAGER, ORGANISATION, WRITING, techniciansAt, type Vocation } from './organisation';
import { randomFrom, type Random } from './random';
import type { Fitted } from './unit-record';
import type { Vehicle } from './vehicles';
import type { World } from './world';

/** Planted: nobody has measured one yet, so that its units have nothing to be compared with. */
export const NEVER_MEASURED = 'Lumo 12';

/** Compressors that are measured at all, and of them those that are measured again. */
const MEASURED_SHARE = 0.4;
const AGAIN_SHARE = 0.35;
/** At a service, before noon. */
const MEASURED_AT = 9 * 60 + 25;

/** A set so soon after a case was closed shows that its repair held. */
const PROVED_WITHIN_DAYS = 60;

/** Share of time loaded in good order. */
const LOADED: Record<Vocation, number> = { 'long-haul': 0.11, regional: 0.17, 'stop-start': 0.29, 'air-for-unloading': 0.33 };

/** How often each is measured: what takes longer is left out more often. */
const MEASURED: Record<FigureId, number> = { 'build-up-time': 0.97, 'head-temperature': 0.88, 'leak-down-released': 0.92, 'share-loaded': 0.55, 'oil-carried': 0.4 };

/** The healthy baselines that were measured on a unit's compressors, as the service writes them. */
export function measureBaselines(world: World, vehicle: Vehicle, fits: readonly Fitted[], random: Random): void {
  for (const fitted of fits) {
    if (fitted.model.name === NEVER_MEASURED || !random.chance(MEASURED_SHARE)) continue;
    const first = Math.max(fitted.day, vehicle.firstDay) + random.whole(20, 260);
    measure(world, vehicle, fitted, first, random);
    if (random.chance(AGAIN_SHARE)) measure(world, vehicle, fitted, first + random.whole(120, 400), random);
  }
}

function measure(world: World, vehicle: Vehicle, fitted: Fitted, day: number, random: Random): void {
  const { calendar, rows } = world;
  const measuredOn = calendar.date(day);
  const { removedOn } = fitted.row;
  if (day >= DAYS_OF_RECORD || (removedOn && measuredOn >= removedOn)) return;
  const at = calendar.at(day, MEASURED_AT, vehicle.site.timeZone);
  const occasion = occasionOf(world, vehicle, at);
  if (!occasion) return;

  const outsideC = Math.round((vehicle.site.climate.january + vehicle.site.climate.july) / 2 + 8 * random.normal());
  const typed = typedFigures(vehicle, fitted, outsideC, random);
  if (Object.keys(typed).length === 0) return;
  const figures = readFigures(WRITING, typed);
  const { columns, asTyped } = readMeasures(WRITING, CONDITION_MEASURES, typed);
  const conditions: Conditions = columns;
  const organisationId = ORGANISATION.id;
  const id = newId(at.getTime(), random.bytes(16));
  const by = (random.shuffled(techniciansAt(vehicle.site.key, day))[0] ?? DEMO_MANAGER).id;
  const set = { unitId: vehicle.id, fitId: fitted.id, modelId: fitted.model.id, occasion, measuredOn, conditions, asTyped, note: null };
  rows.baselineSet.push({ ...set, organisationId, id, createdBy: by, createdAt: at });
  rows.baselineFigure.push(...figures.map((figure) => ({ ...figure, organisationId, setId: id })));
  const changed = { ...set, ...Object.fromEntries(figures.map(({ figure, valueTyped }) => [figure, valueTyped])) };
  rows.audit.push(audited(random, at, by, { action: 'record.baseline-set', entity: 'baseline-set', entityId: id, changed }));
}

/** Nothing while a case is open: the unit isn't known to be in good order. */
function occasionOf({ rows }: World, vehicle: Vehicle, at: Date): Occasion | null {
  const before = rows.cases.filter(({ unitId, openedAt }) => unitId === vehicle.id && openedAt <= at);
  if (before.some(({ closedAt }) => !closedAt || closedAt > at)) return null;
  const proved = before.some(({ closedAt }) => closedAt && at.getTime() - closedAt.getTime() < PROVED_WITHIN_DAYS * 86_400_000);
  return proved ? 'proved-repair' : 'service';
}

type Typed = Record<string, string> & Partial<Record<ConditionId, string>>;

/** What was typed: a model has its own usual figures, a unit lies about them. */
function typedFigures(vehicle: Vehicle, { model }: Fitted, outsideC: number, random: Random): Typed {
  const usual = randomFrom(`demo/baseline/${model.name}`);
  const [buildUpS, headC, leakPsi, oil] = [usual.between(15, 21), usual.between(138, 168), usual.between(0.5, 1), usual.between(0.06, 0.16)];
  const spread = (by: number) => Math.exp(by * random.normal());
  const values: Record<FigureId, string> = {
    'build-up-time': `${Math.max(8, Math.round(buildUpS * spread(0.09)))} s`,
    'head-temperature': `${Math.round((headC + 0.7 * (outsideC - 15) + 5 * random.normal()) * 1.8 + 32)} °F`,
    'leak-down-released': `${Math.max(0.1, leakPsi * spread(0.3)).toFixed(1)} psi/min`,
    'share-loaded': `${Math.min(60, Math.round(100 * LOADED[vehicle.vocation] * spread(0.15)))} %`,
    'oil-carried': `${Math.max(0.02, oil * spread(0.35)).toFixed(2)} mL/h`,
  };
  const given = (Object.keys(values) as FigureId[]).filter((figure) => random.chance(MEASURED[figure]));
  const conditions = { ambient: `${Math.round(outsideC * 1.8 + 32)} °F`, engineSpeed: `${random.pick([1500, 1550, 1600, 1650, 1700])} rpm`, loadedFor: '10 min' };
  return { ...Object.fromEntries(given.map((figure) => [figureOf(figure).field, values[figure]])), ...(given.includes('head-temperature') && conditions) };
}
