import { z } from 'zod';
import { JOB_STATES } from '@/lib/schemas/job';
import { count, id, instant, list } from './common';

const state = z.enum(JOB_STATES);

export const jobList = list(
  'jobs',
  z.object({
    id,
    kind: z.string().meta({ description: 'As `kind` of the filter takes it.' }),
    name: z.string().meta({ description: 'The kind in words.' }),
    state,
    attempts: count.meta({ description: 'Begun, whatever came of them.' }),
    createdAt: instant,
    startedAt: instant.nullable().meta({ description: 'Of the last attempt.' }),
    finishedAt: instant.nullable(),
    nextTryAt: instant.nullable().meta({ description: 'Of one that waits.' }),
    error: z.string().nullable().meta({ description: 'Why the last attempt came to nothing, in words.' }),
    canRetry: z.boolean(),
    mail: z
      .object({
        to: z.string().nullable().meta({ description: 'Null once it was forgotten.' }),
        subject: z.string(),
        state: z.enum(['waiting', 'sent', 'given-up']),
        sentAt: instant.nullable(),
      })
      .nullable(),
  }),
).meta({ id: 'JobList' });

export const retried = z.object({ id, isRetried: z.boolean().meta({ description: 'False when it had not failed: its state says what it is at.' }), state }).meta({ id: 'RetriedJob' });
