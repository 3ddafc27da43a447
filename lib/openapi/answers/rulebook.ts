import { z } from 'zod';
import { STATION_IDS } from '@/lib/diagnose/stations';
import type { RulebookView } from '@/lib/schemas/case-view';
import { setUp } from './case-state';
import { count, id } from './common';

const station = z.enum(STATION_IDS);
const idAndLabel = z.object({ id: z.string(), label: z.string() });

const check = z
  .object({
    id: z.string(),
    station,
    kind: z.enum(['choice', 'measured']),
    name: z.string(),
    prompt: z.string(),
    why: z.string(),
    steps: z.array(z.string()),
    tools: z.array(z.string()),
    minutes: z.number(),
    setUp,
    cautions: z.array(z.string()).meta({ description: 'To be acknowledged before it is answered.' }),
    basis: z.enum(['regulation', 'common practice', 'judgement']),
    source: z.string().optional(),
    answers: z.array(idAndLabel).meta({ description: 'The states that it can be answered with.' }),
    unitSymbol: z.string().nullable().meta({ description: 'What a measured value without a unit is taken to be in.' }),
    errorSymbol: z.string().nullable(),
    usualError: z.string().nullable(),
    sum: z.string().nullable().meta({ description: 'The sum of the bench that works its value out.' }),
    overDays: z.boolean().meta({ description: 'Its oil can be caught over days and weighed more than once.' }),
    spoils: z.array(z.object({ id: z.string(), name: z.string() })),
  })
  .meta({ id: 'Check' });

const rulebook = z.object({
  checks: z.record(z.string(), check),
  panels: z.array(z.object({ id: z.string(), station, title: z.string(), prompt: z.string(), checks: z.array(z.string()) })),
  causes: z.record(z.string(), z.object({ name: z.string(), sentence: z.string(), station: station.nullable() })),
  cautions: z.record(z.string(), z.object({ text: z.string(), worseWhen: z.array(z.string()) })),
}) satisfies z.ZodType<RulebookView>;

export const rulebookAnswer = rulebook
  .extend({
    edition: z.object({ id, number: count }),
    complaints: z.array(idAndLabel).meta({ description: 'What a case can be opened with.' }),
  })
  .meta({ id: 'Rulebook', description: 'What is asked and said, without the rules. Measures are in your units.' });
