import { z } from 'zod';
import type { CaseReasons, CaseState } from '@/lib/schemas/case-view';
import { STATION_IDS } from '@/lib/diagnose/stations';
import { count, id, instant, probability } from './common';

/** What a case looks like, as lib/schemas/case-view.ts has it: the types hold each other. */

export const setUp = z
  .object({
    engine: z.enum(['off', 'idle', 'governed']).optional(),
    air: z.enum(['full', 'empty']).optional(),
    heat: z.enum(['hot', 'cold']).optional(),
    brakes: z.enum(['released', 'applied']).optional(),
    access: z.array(z.enum(['wheels-chocked', 'cab-tilted', 'panels-off', 'line-open', 'head-off', 'compressor-off'])).optional(),
  })
  .meta({ id: 'SetUp', description: 'The state that a vehicle is in, or has to be in.' });

export const stage = z
  .discriminatedUnion('kind', [
    z.object({ kind: z.literal('diagnosis') }),
    z.object({ kind: z.literal('after-remedy'), remedy: count }),
    z.object({ kind: z.literal('release') }),
    z.object({ kind: z.literal('watch') }),
  ])
  .meta({ id: 'Stage' });

export const note = z.object({ id, text: z.string(), person: z.string(), at: instant, waits: z.boolean().optional() });

const finding = z
  .object({
    id,
    checkId: z.string(),
    stage,
    source: z.string(),
    kind: z.string(),
    answer: z.string().meta({ description: 'In words: “48 s ± 1 s”, “Heavy bead”, “Can’t tell”.' }),
    shares: z.array(z.object({ state: z.string(), share: probability })),
    sum: z
      .object({ id: z.string(), search: z.record(z.string(), z.string()) })
      .nullable()
      .meta({ description: 'The sum of the bench that it came from, with all that went in.' }),
    judgement: z.object({ verdict: z.enum(['within', 'out']), text: z.string() }).nullable().meta({ description: 'What the limit that the organisation adopted says of the value, and which limit.' }),
    compared: z.string().nullable().meta({ description: 'How it stands to the healthy baseline that counted when it was given, in words.' }),
    thinkSo: z.boolean(),
    person: z.string(),
    at: instant,
    receivedAt: instant,
    late: z.boolean().meta({ description: 'It came after a newer answer to the same check, and does not count.' }),
    current: z.boolean(),
    notes: z.array(note),
    waits: z.boolean().optional(),
  })
  .meta({ id: 'Finding' });

const suggestion = z.object({
  checkIds: z.array(z.string()),
  panelId: z.string().nullable(),
  word: z.string(),
  bits: z.number(),
  minutes: z.number(),
  setUpMinutes: z.number(),
  because: z.string().nullable(),
});

const next = z
  .object({
    suggestions: z.array(suggestion),
    stop: z.boolean().meta({ description: 'Enough is known: no check is worth its time any more.' }),
    stopReason: z.string().nullable(),
    spoiled: z.array(z.object({ checkId: z.string(), by: z.string() })),
  })
  .meta({ id: 'NextChecks', description: 'The checks that tell most for their minutes, the best first.' });

export const caseState = z
  .object({
    caseId: id,
    version: count,
    status: z.enum(['open', 'called', 'closed']),
    runId: id.nullable(),
    at: instant.nullable().meta({ description: 'The instant that is shown, when it is not now.' }),
    differs: z.boolean(),
    vehicleState: setUp,
    causes: z.array(z.object({ causeId: z.string(), p: probability, change: z.number().nullable(), prior: probability })).meta({ description: 'The most probable first.' }),
    fit: z.discriminatedUnion('fits', [
      z.object({ fits: z.literal(true) }),
      z.object({ fits: z.literal(false), reason: z.enum(['something-else-leads', 'evidence-against-the-leader']) }),
    ]),
    suspicion: z.record(z.enum([...STATION_IDS, 'none']), probability),
    because: z.string().nullable(),
    findings: z.array(finding),
    next,
    repairs: z.array(
      z.object({ remedyId: z.string(), name: z.string(), causeIds: z.array(z.string()), p: probability, lookMinutes: z.number(), fixMinutes: z.number() }),
    ),
    acknowledged: z.array(z.object({ cautionId: z.string(), dangers: z.array(z.string()) })),
    releaseHolds: z.array(z.string()).meta({ description: 'Checks whose answer forbids the unit’s release.' }),
  })
  .meta({ id: 'CaseState' }) satisfies z.ZodType<CaseState>;

const reason = z
  .object({
    findingIds: z.array(id),
    finding: z.string(),
    direction: z.enum(['for', 'against']),
    strength: z.string(),
    decibans: z.number(),
    note: z.string(),
    basis: z.enum(['regulation', 'common practice', 'judgement']).nullable(),
    source: z.string().nullable(),
    without: probability.meta({ description: 'The probability of the cause without this finding.' }),
  })
  .meta({ id: 'Reason' });

export const caseReasons = z
  .object({
    version: count,
    causes: z.record(z.string(), z.array(reason)),
    settle: z.array(z.object({ checkId: z.string(), answer: z.string(), causeId: z.string(), from: probability, to: probability })),
    pair: z.object({ causeIds: z.tuple([z.string(), z.string()]), leadDecibans: z.number() }).nullable(),
  })
  .meta({ id: 'CaseReasons' }) satisfies z.ZodType<CaseReasons>;
