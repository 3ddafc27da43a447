import * as z from 'zod';
import { isReserved, LIMITS } from './schema-limits';
import { STATION_IDS } from './stations';

/** Every key, type and plain range of a rulebook. What needs two places to see is checked by the other files. */

/** Refusals in our own words; `schema-messages.ts` knows what to advise for each. */
export const REFUSALS = {
  reserved: 'is a reserved name',
  emptyText: 'is empty, or begins or ends with a space',
  empty: 'is empty',
  missing: 'is missing',
} as const;

const idSchema = z
  .string()
  .max(64)
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, { error: 'is not an id' })
  .refine((id) => !isReserved(id), { error: REFUSALS.reserved });

const factNameSchema = z
  .string()
  .max(64)
  .regex(/^[A-Za-z][A-Za-z0-9]*([.-][A-Za-z0-9]+)*$/, { error: 'is not the name of a fact' })
  .refine((name) => !isReserved(name), { error: REFUSALS.reserved });

const textSchema = z
  .string()
  .max(LIMITS.textLength)
  .refine((text) => text.trim() === text && text !== '', { error: REFUSALS.emptyText });

/** A name is also a key of tables and lists: one line, not too long. */
const nameSchema = textSchema
  .max(160)
  .regex(/^\P{Cc}*$/u, { error: 'has a line break or another control character' })
  .refine((name) => !isReserved(name), { error: REFUSALS.reserved });

const listOf = <T extends z.ZodType>(item: T, most: number) => z.array(item).max(most);
const idsSchema = listOf(idSchema, LIMITS.items);
const textsSchema = listOf(textSchema, LIMITS.items);
const stationSchema = z.enum(STATION_IDS);
const basisSchema = z.enum(['regulation', 'common practice', 'judgement']);
const minutesSchema = z.number().min(0).max(10_000);
const moneySchema = z.number().min(0).max(1e9);
/** A share that may be neither nothing nor everything. */
const shareSchema = z.number().gt(0).lt(1);
const reliabilitySchema = z.number().gt(0).max(1);
const rhoSchema = z.number().min(0).max(1);
const sourced = { basis: basisSchema, source: textSchema.optional() };

const accessSchema = z.enum(['wheels-chocked', 'cab-tilted', 'panels-off', 'line-open', 'head-off', 'compressor-off']);
const engineSchema = z.enum(['off', 'idle', 'governed']);
const airSchema = z.enum(['full', 'empty']);
const heatSchema = z.enum(['hot', 'cold']);
const brakesSchema = z.enum(['released', 'applied']);

const settingsSchema = z.strictObject({
  beta: z.number().gt(0).max(1.5),
  defaultRho: rhoSchema,
  defaultReliability: reliabilitySchema,
  labourRatePerHour: moneySchema,
  serviceCost: moneySchema,
  comebackCost: moneySchema,
  setUpMinutes: z.strictObject({
    engine: z.record(engineSchema, minutesSchema),
    air: z.record(airSchema, minutesSchema),
    heat: z.record(heatSchema, minutesSchema),
    brakes: z.record(brakesSchema, minutesSchema),
    access: z.record(accessSchema, minutesSchema),
  }),
});

const causeSchema = z.strictObject({
  id: idSchema,
  station: stationSchema.nullable(),
  name: nameSchema,
  sentence: textSchema,
  prior: shareSchema,
  ...sourced,
  costIfLeft: moneySchema.optional(),
});

const stateSchema = z.strictObject({
  id: idSchema,
  label: nameSchema,
  background: shareSchema,
  low: z.number().optional(),
  high: z.number().optional(),
  holdsRelease: z.literal(true).optional(),
});

const QUANTITIES = [
  'pressure', 'pressureRate', 'vacuum', 'length', 'volume', 'temperature', 'temperatureDifference',
  'duration', 'distance', 'oilRate', 'ratio', 'count', 'cycleRate',
] as const;

const checkSchema = z.strictObject({
  id: idSchema,
  station: stationSchema,
  kind: z.enum(['choice', 'measured']),
  quantity: z.enum(QUANTITIES).optional(),
  unit: nameSchema.optional(),
  usualError: z.number().min(0).optional(),
  range: z.strictObject({ min: z.number(), max: z.number() }).optional(),
  name: textSchema,
  prompt: textSchema,
  why: textSchema,
  steps: textsSchema,
  tools: textsSchema,
  minutes: minutesSchema,
  setUp: z.strictObject({
    engine: engineSchema.optional(),
    air: airSchema.optional(),
    heat: heatSchema.optional(),
    brakes: brakesSchema.optional(),
    access: z.array(accessSchema).max(6).optional(),
  }),
  spoils: idsSchema,
  cautions: idsSchema,
  states: z.array(stateSchema).min(2).max(LIMITS.statesInACheck),
  cannotTell: z.number().min(0).lt(1),
  reliability: reliabilitySchema.optional(),
  fromRecord: z.strictObject({ fact: factNameSchema, states: z.record(z.string().max(160), idSchema).optional() }).optional(),
  sum: z.strictObject({ id: idSchema, output: factNameSchema }).optional(),
  compares: idSchema.optional(),
  ...sourced,
});

const panelSchema = z.strictObject({
  id: idSchema,
  station: stationSchema,
  title: nameSchema,
  prompt: textSchema,
  checks: idsSchema.min(1),
});

const ruleSchema = z.strictObject({
  name: nameSchema,
  /** Walked by hand (`schema-conditions.ts`), so that every trap gets a message of its own. */
  conditions: z.unknown().refine((value) => value !== undefined, { error: REFUSALS.missing }),
  weights: z.record(idSchema, z.number()).refine((weights) => Object.keys(weights).length > 0, { error: REFUSALS.empty }),
  group: idSchema.optional(),
  note: textSchema,
  ...sourced,
});

const remedySchema = z.strictObject({
  id: idSchema,
  station: stationSchema.nullable(),
  name: nameSchema,
  causes: idsSchema.min(1),
  look: z.strictObject({ minutes: minutesSchema }),
  fix: z.strictObject({ minutes: minutesSchema }),
  parts: listOf(z.strictObject({ name: nameSchema, cost: moneySchema }), LIMITS.items),
  seenInBay: z.boolean(),
  fitsCompressor: z.literal(true).optional(),
  steps: textsSchema,
  cautions: idsSchema,
  ...sourced,
});

const cautionSchema = z.strictObject({
  id: idSchema,
  text: textSchema,
  worseWhen: z.array(z.enum(['engine-running', 'brakes-released', 'system-opened'])).max(3),
});

const whenSchema = z.union([
  z.string().max(160),
  z.strictObject({ atLeast: z.number().optional(), below: z.number().optional() }),
]);

const priorVariantSchema = z.strictObject({
  name: nameSchema,
  when: z.record(factNameSchema, whenSchema).refine((when) => Object.keys(when).length > 0, { error: REFUSALS.empty }),
  priors: z.record(idSchema, shareSchema).refine((priors) => Object.keys(priors).length > 0, { error: REFUSALS.empty }),
});

const metresSchema = z.number().gt(0).max(1e9);
const secondsSchema = z.number().gt(0).max(1e9);
const pascalsSchema = z.number().gt(0).max(1e8);

const releaseCheckSchema = z.strictObject({ check: idSchema, inOrder: idsSchema.min(1) });

const proofSchema = z.strictObject({
  fitting: z.strictObject({ cautions: idsSchema }),
  breakIn: z.strictObject({
    engineRpm: z.number().gt(0).max(10_000),
    pressure: z.strictObject({ aim: pascalsSchema, low: pascalsSchema, high: pascalsSchema }),
    duration: z.strictObject({ least: secondsSchema, most: secondsSchema }),
    cautions: idsSchema,
    ...sourced,
  }),
  release: z.strictObject({
    checks: listOf(releaseCheckSchema, LIMITS.items).min(1),
    oilDownstream: z.strictObject({ when: listOf(z.strictObject({ check: idSchema, states: idsSchema.min(1) }), LIMITS.items), checks: listOf(releaseCheckSchema, LIMITS.items) }),
  }),
  watch: z.strictObject({
    begin: textsSchema,
    plans: listOf(
      z.strictObject({
        id: idSchema,
        name: nameSchema,
        causes: idsSchema,
        readings: listOf(z.strictObject({ check: idSchema, inOrder: idsSchema.min(1), every: secondsSchema, everyDistance: metresSchema.optional() }), LIMITS.items).min(1),
        duration: secondsSchema,
        distance: metresSchema.optional(),
        ...sourced,
      }),
      LIMITS.items,
    ).min(1),
  }),
});

/** The shape of a rulebook, conditions left open. `parseRulebook` is what to call. */
export const rulebookShape = z.strictObject({
  schemaVersion: z.literal(1),
  title: nameSchema,
  settings: settingsSchema,
  causes: listOf(causeSchema, LIMITS.causes).min(1),
  checks: listOf(checkSchema, LIMITS.checks),
  panels: listOf(panelSchema, LIMITS.panels),
  evidenceGroups: listOf(z.strictObject({ id: idSchema, name: nameSchema, rho: rhoSchema.optional() }), LIMITS.evidenceGroups),
  rules: listOf(ruleSchema, LIMITS.rules),
  remedies: listOf(remedySchema, LIMITS.remedies),
  cautions: listOf(cautionSchema, LIMITS.cautions),
  priorVariants: listOf(priorVariantSchema, LIMITS.priorVariants).optional(),
  proof: proofSchema.optional(),
});

/** A rulebook whose conditions have not been looked at yet. */
export type ShapedRulebook = z.infer<typeof rulebookShape>;
