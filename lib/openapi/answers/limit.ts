import { z } from 'zod';
import { count, day, id, instant, list } from './common';

/** Adopted limits, and what stands against the release of a unit. */

const text = z.string().nullable();

export const limitList = list(
  'limits',
  z.object({
    id,
    checkId: z.string(),
    checkName: z.string(),
    text: z.string().meta({ description: 'In words and your units: “at least 100 psi”.' }),
    least: z.number().nullable().meta({ description: 'SI.' }),
    most: z.number().nullable().meta({ description: 'SI.' }),
    below: z.boolean().meta({ description: 'The highest value itself is out.' }),
    source: z.string(),
    modelId: id.nullable(),
    modelName: text,
    country: text,
    vehicleKind: text,
    builtFrom: day.nullable(),
    builtBefore: day.nullable(),
    person: z.string(),
    adoptedAt: instant,
  }),
).meta({ id: 'LimitList' });

export const holdList = z
  .object({
    standing: z.array(z.object({ id, caseId: id, number: count, checkId: z.string(), check: z.string(), placedAt: instant, passedAt: instant.nullable() })),
    lifted: z.array(
      z.object({ id, caseId: id, number: count, checkId: z.string(), check: z.string(), liftedAt: instant, by: z.string(), found: z.string(), basis: text, limitSource: text }),
    ),
  })
  .meta({ id: 'HoldList' });
