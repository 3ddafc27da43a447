import { z } from 'zod';
import { BEGIN_ANSWERS } from '@/lib/schemas/watch';
import type { CaseWatches } from '@/lib/services/watch/list';
import { count, day, id, instant, si } from './common';

const text = z.string();
const anotherCase = z.object({ caseId: id, number: count });

const reading = z.object({
  id,
  checkId: text,
  check: text,
  answer: text,
  isInOrder: z.boolean(),
  note: text.nullable(),
  odometerM: si('m'),
  by: text,
  byLink: z.boolean().meta({ description: 'By somebody without a sign-in.' }),
  at: instant,
  takenBack: z.object({ at: instant, by: text, why: text }).nullable(),
});

const watch = z.object({
  id,
  cause: text,
  plan: text,
  begin: z.array(z.object({ statement: text, answer: z.enum(BEGIN_ANSWERS), why: text.nullable() })),
  startedAt: instant,
  startedBy: text,
  odometerM: si('m'),
  ends: z.object({ on: day, atM: si('m') }),
  readings: z.array(reading),
  due: z.array(z.object({ checkId: text, check: text, dueOn: day, dueAtM: si('m'), state: z.enum(['waits', 'due', 'overdue']) })),
  notHeldYet: z.array(text).meta({ description: 'Why it can’t be said yet that it held.' }),
  mayGoOnIn: z.array(anotherCase.extend({ openedOn: day })).meta({ description: 'Open cases of the unit that may be its comeback.' }),
  links: z.array(z.object({ id, check: text, forWhom: text, createdBy: text, expiresAt: instant, state: z.enum(['used', 'revoked', 'expired', 'open']), path: text.nullable() })),
  endedAt: instant.nullable(),
  endedBy: text.nullable(),
  outcome: text.nullable(),
  why: text.nullable(),
  proof: text.nullable(),
  comeback: anotherCase.nullable(),
});

const planned = z.object({
  cause: text,
  name: text,
  begin: z.array(text),
  days: count,
  distanceM: si('m'),
  readings: z.array(z.object({ checkId: text, check: text, everyDays: count, everyDistanceM: si('m') })),
});

export const watchList = z.object({ caseId: id, planned: planned.nullable(), watches: z.array(watch) }).meta({ id: 'WatchList' }) satisfies z.ZodType<CaseWatches>;
export const watchEnded = z.object({ id, caseId: id, comebackCaseId: id.nullable() });
