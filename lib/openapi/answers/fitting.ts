import { z } from 'zod';
import { BREAK_IN_EVENTS } from '@/lib/break-in';
import type { BreakInView } from '@/lib/schemas/break-in';
import { INSTALL_GROUPS } from '@/lib/fitting';
import type { FittingsView } from '@/lib/schemas/fitting';
import type { ReleaseView } from '@/lib/schemas/release';
import { day, id, instant } from './common';

const text = z.string();
const cautions = z.array(z.object({ id: text, text }));
const toRead = z.array(text).meta({ description: 'Cautions that you have still to acknowledge today.' });
const asks = z.enum(['note', 'value', 'value-and-note']);

const point = z.object({
  id: text,
  group: z.enum(Object.keys(INSTALL_GROUPS) as [keyof typeof INSTALL_GROUPS]),
  name: text,
  prompt: text,
  why: text,
  photo: z.literal(true).optional(),
  valueHint: text.optional(),
  noteHint: text.optional(),
  answers: z.array(z.object({ id: text, label: text, asks: asks.nullable(), against: z.boolean().meta({ description: 'Known to shorten a compressor’s life.' }) })),
  said: z.object({ answer: text, label: text, against: z.boolean(), value: text.nullable(), note: text.nullable(), by: text, at: instant }).nullable(),
});

export const fittingList = z
  .object({
    caseId: id,
    unitId: id,
    cautions,
    toRead,
    fittings: z.array(
      z.object({ id, fitId: id, modelName: text, installedOn: day, startedAt: instant, startedBy: text, finishedAt: instant.nullable(), finishedBy: text.nullable(), points: z.array(point) }),
    ),
  })
  .meta({ id: 'FittingList' }) satisfies z.ZodType<FittingsView>;

export const fittingStarted = z.object({ id, caseId: id, fitId: id });

const pascals = z.number().meta({ description: 'Pa' });
const seconds = z.number().meta({ description: 's' });

const figures = z.object({
  engineRpm: z.number(),
  pressure: z.object({ aim: pascals, low: pascals, high: pascals }),
  duration: z.object({ least: seconds, most: seconds }),
  from: z.enum(['model', 'edition']),
  source: text.nullable(),
});

const leak = z.enum(['none', 'leak']);

export const breakInList = z
  .object({
    caseId: id,
    cautions,
    toRead,
    figures: figures.nullable(),
    modelName: text.nullable(),
    bleed: z.record(text, text).meta({ description: 'Inputs of the bench’s sum of the bleed.' }),
    runs: z.array(
      z.object({
        id,
        figures,
        startedAt: instant,
        startedBy: text,
        endedAt: instant.nullable(),
        endedBy: text.nullable(),
        outcome: text.nullable().meta({ description: 'done, stopped' }),
        whyStopped: text.nullable(),
        hotCheck: z.object({ oil: leak, coolant: z.enum(['none', 'leak', 'not-applicable']), where: text.nullable() }).nullable(),
        events: z.array(z.object({ id, kind: z.enum(BREAK_IN_EVENTS), at: instant, reason: text.nullable(), pressure: text.nullable(), pressurePa: pascals.nullable(), by: text })),
      }),
    ),
  })
  .meta({ id: 'BreakInList' }) satisfies z.ZodType<BreakInView>;

export const releaseAnswer = z
  .object({
    caseId: id,
    unitId: id,
    checks: z.array(
      z.object({
        checkId: text,
        name: text,
        because: text.nullable().meta({ description: 'What found oil downstream, where that is why it is asked.' }),
        verdict: z.enum(['in-order', 'out', 'missing']),
        measured: z.object({ findingId: id, answer: text, by: text, at: instant, stale: z.boolean().meta({ description: 'Before the last work on the vehicle.' }), judgement: text.nullable() }).nullable(),
      }),
    ),
    whyNot: text.nullable(),
    holds: z.array(text),
    mayRelease: z.boolean(),
    releases: z.array(z.object({ id, releasedAt: instant, releasedBy: text, basis: text.nullable(), note: text.nullable(), on: z.array(z.object({ name: text, answer: text })) })),
  })
  .meta({ id: 'Release' }) satisfies z.ZodType<ReleaseView>;
