import { z } from 'zod';
import { browseCasesInput, cursorOf } from './browse';
import { pageNumber, rowId } from './common';
import { filterOf } from './list';

/** Kinds of jobs that an administrator sees, as the queue calls them. */
export const SEEN_JOBS = {
  'send-mail': { name: 'Mail', whose: 'organisation' },
  'remind-weighing': { name: 'Reminder to weigh oil', whose: 'organisation' },
  'remind-watch': { name: 'Reminder of a watch', whose: 'organisation' },
  'make-dossier': { name: 'PDF of a dossier', whose: 'organisation' },
  'mail-daily-notices': { name: 'Mail of the day’s notices', whose: 'organisation' },
  'make-thumbnail': { name: 'Small picture of a photo', whose: 'organisation' },
  sweep: { name: 'Nightly clearing up', whose: 'everybody' },
} as const satisfies Record<string, { name: string; whose: 'organisation' | 'everybody' }>;

export type SeenJob = keyof typeof SEEN_JOBS;
export const SEEN_JOB_NAMES = Object.keys(SEEN_JOBS) as [SeenJob, ...SeenJob[]];
export const isSeenJob = (name: string): name is SeenJob => name in SEEN_JOBS;

export const JOB_STATES = ['waiting', 'running', 'failed', 'done'] as const;
export type JobState = (typeof JOB_STATES)[number];

/** The filter of the page; nonsense in its address is as if it weren't there. */
export const listJobsInput = z.object({ kind: filterOf(SEEN_JOB_NAMES), state: filterOf(JOB_STATES), page: pageNumber.default(1) });

export const browseJobsInput = z.strictObject({
  kind: z.enum(SEEN_JOB_NAMES).optional(),
  state: z.enum(JOB_STATES).optional(),
  limit: browseCasesInput.shape.limit,
  cursor: cursorOf([z.iso.datetime(), rowId]),
});

export const jobIdInput = z.strictObject({ jobId: rowId });
