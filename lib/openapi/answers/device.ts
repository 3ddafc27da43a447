import { z } from 'zod';
import { rulebookShape } from '@/lib/diagnose/schema-shape';
import { baseline } from './baseline';
import { setUp, stage } from './case-state';
import { count, day, id, instant, probability } from './common';

/** What a device asks for, to go on without a connection. */

/** SI; null: no limit on that side. */
const limit = z.object({ id, checkId: z.string(), least: z.number().nullable(), most: z.number().nullable(), below: z.boolean(), source: z.string() });

const row = z.object({
  id,
  checkId: z.string(),
  stage,
  source: z.string(),
  askedBecause: z.string(),
  kind: z.string(),
  shares: z.array(z.object({ state: z.string(), share: probability })),
  reliability: z.number(),
  valueTyped: z.string().nullable(),
  errorTyped: z.string().nullable(),
  unit: z.string().nullable(),
  valueSi: z.number().nullable(),
  errorSi: z.number().nullable(),
  sum: z
    .object({
      id: z.string(),
      output: z.string(),
      inputs: z.array(z.object({ id: z.string(), typed: z.string().nullable(), errorTyped: z.string().nullable(), unit: z.string(), si: z.number(), halfWidthSi: z.number() })),
      low: z.number().nullable(),
      high: z.number().nullable(),
    })
    .nullable(),
  judgement: z.object({ limit, verdict: z.enum(['within', 'out']), doubtful: z.boolean() }).nullable(),
  baseline: baseline.nullable().meta({ description: 'What it was compared with when it was given.' }),
  person: z.string(),
  correctedAt: instant,
  receivedAt: instant,
  late: z.boolean(),
});

export const caseKit = z
  .object({
    caseId: id,
    editionId: id,
    organisationId: id,
    personId: id,
    version: count,
    status: z.string(),
    vehicleState: setUp,
    labourRatePerHour: z.number().nullable(),
    timeZone: z.string(),
    rows: z.array(row),
    notes: z.array(z.object({ id, findingId: id, text: z.string(), person: z.string(), at: instant })),
    baselines: z.record(z.string(), baseline).meta({ description: 'What answers are compared with, by check.' }),
    run: z.object({ id, recordFacts: z.record(z.string(), z.union([z.string(), z.number()])), becauseOf: z.string().nullable() }),
    previous: z.array(z.object({ causeId: z.string(), p: probability })).nullable(),
    acknowledged: z.array(z.object({ cautionId: z.string(), dangers: z.array(z.string()) })),
    acknowledgedOn: day,
    limits: z.record(z.string(), limit).optional().meta({ description: 'That measured values are judged by, by check.' }),
    person: z.object({ name: z.string(), units: z.record(z.string(), z.string()), decimal: z.enum(['.', ',']).optional() }),
  })
  .meta({ id: 'CaseKit' });

export const editionAnswer = z.object({ id, rulebook: rulebookShape }).meta({ id: 'Edition' });

export const casesToKeepAnswer = z.object({ cases: z.array(z.object({ id, version: count, thumbnails: z.array(z.string()) })) }).meta({ id: 'CasesToKeep' });

export const events = z.string().meta({ description: '“changed” whenever the case may have been written to; nothing of the case itself.' });
