import { z } from 'zod';
import { asTyped, count, id, instant, si } from './common';

/** Oil that is caught over days. Measures are SI: kg, s, m³/s. */

const rate = z.object({ si: z.number().meta({ description: 'm³/s' }), low: z.number().nullable(), high: z.number().nullable() }).nullable();

const weighing = z.object({
  id,
  massKg: z.number(),
  massErrorKg: z.number(),
  engineS: si('s').meta({ description: 'Hour meter.' }),
  ranS: z.number().meta({ description: 'That the engine ran since the weighing before.' }),
  asTyped,
  note: z.string().nullable(),
  by: z.string(),
  at: instant,
  findingId: id.meta({ description: 'What it was written into the case as.' }),
  perHour: rate.meta({ description: 'By itself.' }),
  takenBack: z.object({ at: instant, by: z.string(), why: z.string() }).nullable(),
});

export const caseCatches = z
  .object({
    caseId: id,
    checks: z.array(z.object({ id: z.string(), name: z.string() })).meta({ description: 'That oil can be caught for.' }),
    catches: z.array(
      z.object({
        id,
        checkId: z.string(),
        check: z.string(),
        startedAt: instant,
        startedBy: z.string(),
        engineS: si('s'),
        asTyped,
        place: z.string().nullable(),
        remindEveryDays: count.nullable(),
        remindAt: instant.nullable(),
        endedAt: instant.nullable(),
        endedBy: z.string().nullable(),
        endedWhy: z.string().nullable(),
        weighings: z.array(weighing),
        perHour: rate.meta({ description: 'Of all that stand together.' }),
      }),
    ),
  })
  .meta({ id: 'CaseCatches' });

export const catchWritten = z.object({ id, caseId: id });
