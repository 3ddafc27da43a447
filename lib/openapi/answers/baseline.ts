import { z } from 'zod';
import type { Baseline } from '@/lib/baseline/baseline-for';
import { FIGURE_IDS } from '@/lib/baseline/figures';
import type { Pooled } from '@/lib/baseline/pool';
import { OCCASIONS } from '@/lib/baseline/set';
import { asTyped, count, day, id, si } from './common';

/** Healthy baselines. Measures are SI: s, K, Pa/s, a share, m³/s. */

const figure = z.enum(FIGURE_IDS);
const occasion = z.enum(OCCASIONS);
const conditions = z.object({ ambientK: si('K'), engineSpeedPerS: si('turns a second'), loadedS: si('s') });

const pooled = z.object({
  median: z.number(),
  lower: z.number().meta({ description: 'Lower quartile.' }),
  upper: z.number().meta({ description: 'Upper quartile.' }),
  units: count.meta({ description: 'Each counts once, by its latest set.' }),
  sets: count,
  firstOn: day,
  lastOn: day,
}) satisfies z.ZodType<Pooled>;

const own = z.object({ from: z.literal('own'), figure, si: z.number(), errorSi: z.number(), setId: id, measuredOn: day, occasion, conditions });

/** What one figure is compared with, or was. */
export const baseline = z
  .discriminatedUnion('from', [own, pooled.extend({ from: z.literal('model'), figure })])
  .meta({ id: 'Baseline', description: 'What a figure is compared with: the unit’s own latest set since its compressor was fitted, else its model’s pool of three units or more.' }) satisfies z.ZodType<Baseline>;

export const unitBaseline = z
  .object({
    unitId: id,
    model: z.object({ id, name: z.string() }).nullable(),
    since: day.nullable().meta({ description: 'The day of the fit: sets from before were measured on another compressor.' }),
    figures: z.array(z.object({ figure, counts: baseline.nullable(), pooled: pooled.nullable() })),
    sets: z
      .array(
        z.object({
          id,
          unitId: id,
          measuredOn: day,
          occasion,
          conditions,
          asTyped,
          note: z.string().nullable(),
          by: z.string().nullable(),
          figures: z.partialRecord(figure, z.object({ si: z.number(), errorSi: z.number() })),
        }),
      )
      .meta({ description: 'Of the unit itself, the latest first; hidden ones are left out.' }),
  })
  .meta({ id: 'UnitBaseline' });

export const baselineWritten = z.object({ id, unitId: id });
export const baselineHidden = z.object({ unitId: id });
