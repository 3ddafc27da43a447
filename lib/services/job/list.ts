import { countJobs, selectJobs } from '@/db/queries/job';
import { PERMITTED } from '@/lib/auth/permissions';
import { cutPage } from '@/lib/schemas/browse';
import { browseJobsInput, listJobsInput } from '@/lib/schemas/job';
import { ROWS_A_PAGE } from '@/lib/schemas/list';
import { defineRead } from '../define';
import { seenJob, seenKinds } from './seen';

/** What waits, runs, failed and was done lately for the organisation, and the nightly work; the newest first. */
export const listJobs = defineRead({
  name: 'list.job',
  doing: 'see jobs',
  roles: PERMITTED['job.see'],
  input: listJobsInput,
  run: async ({ tx, ctx, input: { kind, state, page } }) => {
    const filter = { ...seenKinds(ctx.organisation.id, kind), state };
    const total = await countJobs(tx, filter);
    const pageCount = Math.max(1, Math.ceil(total / ROWS_A_PAGE));
    const shown = Math.min(page, pageCount);
    const rows = await selectJobs(tx, { ...filter, limit: ROWS_A_PAGE, offset: (shown - 1) * ROWS_A_PAGE });
    return { rows: rows.map(seenJob), total, page: shown, pageCount };
  },
});

/** The same, one page after another. */
export const browseJobs = defineRead({
  name: 'browse.job',
  doing: 'see jobs',
  roles: PERMITTED['job.see'],
  input: browseJobsInput,
  run: async ({ tx, ctx, input: { kind, state, limit, cursor } }) => {
    const found = await selectJobs(tx, { ...seenKinds(ctx.organisation.id, kind), state, limit: limit + 1, after: cursor });
    const { rows, next } = cutPage(found, { limit, keysOf: ({ createdAt, id }) => [createdAt, id] });
    return { jobs: rows.map(seenJob), next };
  },
});
