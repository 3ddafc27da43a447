import { measureText } from '@/components/units/MeasureField';
import { FIGURES } from '@/lib/baseline/figures';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { dayText } from '@/lib/schemas/day-text';
import { PARTS_WITH_IT } from '@/lib/schemas/fit';
import { INSTALLED_MEASURES, MODEL_MEASURES, READING_MEASURES, REMOVED_MEASURES, UNIT_MEASURES, type MeasureField } from '@/lib/schemas/measures';
import { WEIGHING_MEASURES } from '@/lib/schemas/oil-catch';
import { termLabel, type TermList } from '@/lib/schemas/terms';
import type { UnitPreferences } from '@/lib/units';

export interface Reader {
  units: UnitPreferences;
  /** Names of the people of the organisation, by id. */
  people: ReadonlyMap<string, string>;
}

interface Fact {
  label: string;
  value: string;
}

/** By the column that a row of the audit names: SI, shown in the reader's units. */
const MEASURES = new Map<string, MeasureField>(
  [...UNIT_MEASURES, ...WEIGHING_MEASURES, ...MODEL_MEASURES, ...READING_MEASURES, ...INSTALLED_MEASURES, ...REMOVED_MEASURES].map((measure) => [measure.column, measure]),
);

const TERMS = new Map<string, TermList>([
  ...(['vehicleKind', 'vocation', 'condition', 'whyOut', 'sealant', 'cooling', 'unloading', 'intakeType', 'drainOpening', 'oilFeedPlace'] as const).map((list) => [list, list] as const),
  ...PARTS_WITH_IT.map(({ field }) => [field, 'withIt'] as const),
  ['systemCleaned', 'yesNo'],
  ['breakInRun', 'yesNo'],
]);

/** Labels that can't be read off the field's own name. */
const LABELS: Readonly<Record<string, string>> = {
  number: 'Case',
  valueTyped: 'Typed',
  checkId: 'Check',
  complaintWords: 'In their words',
  odometerM: 'Odometer',
  engineS: 'Engine hours',
  installedOdometerM: 'Odometer when fitted',
  installedEngineS: 'Engine hours when fitted',
  removedOdometerM: 'Odometer when it came out',
  removedEngineS: 'Engine hours when it came out',
  reservoirM3: 'Reservoirs',
  requiredReservoirM3: 'Reservoirs required',
  reservoirCount: 'Number of reservoirs',
  displacementM3: 'Displacement',
  boreM: 'Bore',
  strokeM: 'Stroke',
  portBoreM: 'Bore of the discharge port',
  lineSizeM: 'Size of the discharge line',
  breakInEngineRpm: 'Engine speed at the break-in run',
  breakInPressurePa: 'Pressure at the break-in run',
  breakInLeastS: 'Least time of the break-in run',
  breakInMostS: 'Most time of the break-in run',
  breakInSource: 'Where the break-in figures are from',
  assignedTo: 'With',
  personId: 'Person',
  onDay: 'Day',
  measuredOn: 'Measured on',
  massKg: 'Oil',
  ranS: 'Engine ran',
  remindEveryDays: 'Reminded every so many days',
  place: 'Where it hangs',
  ...Object.fromEntries(FIGURES.map(({ id, name }) => [id, name])),
};

/** Of use to whoever looks into a fault of ours, and in the raw record all the same. */
const RAW_ONLY = new Set(['kind', 'shares', 'asTyped', 'conditions', 'strokes', 'query', 'cautions', 'version', 'massErrorKg']);

const NAMES = new Map([...defaultRulebook.checks, ...defaultRulebook.causes, ...defaultRulebook.remedies].map(({ id, name }) => [id, name]));
const RULEBOOK_FIELDS = new Set(['checkId', 'remedyId', 'mark', 'outcome', 'mainCause', 'contributingCauses', 'complaints', 'dangers', 'sureness', 'roles', 'scopes', 'status']);

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;
const instant = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });

/** What a row was changed to, as people read it: no ids, nothing empty, measures in the reader's units. */
export function factsOf(changed: Record<string, unknown>, reader: Reader): Fact[] {
  return Object.entries(changed).flatMap(([field, value]) => {
    if (RAW_ONLY.has(field)) return [];
    const words = wordsOf(field, value, reader);
    return words ? [{ label: LABELS[field] ?? labelOf(field), value: words }] : [];
  });
}

function wordsOf(field: string, value: unknown, reader: Reader): string | null {
  if (Array.isArray(value)) return value.map((one) => wordsOf(field, one, reader)).filter(Boolean).join(', ') || null;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  const measure = MEASURES.get(field);
  if (typeof value === 'number') return measure ? measureText(value, measure, reader.units) : field === 'number' && value === 0 ? null : value.toLocaleString('en-GB');
  if (typeof value !== 'string' || value === '') return null;
  if (UUID.test(value)) return reader.people.get(value) ?? null;
  const terms = TERMS.get(field);
  if (terms) return termLabel(terms, value);
  if (RULEBOOK_FIELDS.has(field)) return NAMES.get(value) ?? value.replaceAll('-', ' ');
  if (/^\d{4}-\d\d-\d\d$/.test(value)) return dayText(value);
  if (/^\d{4}-\d\d-\d\dT[\d:.]+Z$/.test(value)) return `${instant.format(new Date(value))}, universal time`;
  return value;
}

/** "dryerCartridgeChangedOn": "Dryer cartridge changed on". */
function labelOf(field: string): string {
  const words = field.replaceAll(/([a-z0-9])([A-Z])/g, '$1 $2').replaceAll('_', ' ').toLowerCase();
  return words.charAt(0).toUpperCase() + words.slice(1);
}
