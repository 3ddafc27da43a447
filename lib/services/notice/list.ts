import { z } from 'zod';
import { countNotices, selectNotices, type NoticeRow } from '@/db/queries/notice';
import { PERMITTED } from '@/lib/auth/permissions';
import { cutPage } from '@/lib/schemas/browse';
import { ROWS_A_PAGE } from '@/lib/schemas/list';
import { browseNoticesInput, listNoticesInput } from '@/lib/schemas/notice';
import { defineRead } from '../define';
import { placeOf, sentenceOf } from './sentence';

const view = (row: NoticeRow) => ({
  id: row.id,
  kind: row.kind,
  sentence: sentenceOf(row),
  caseId: row.caseId,
  place: placeOf(row),
  createdAt: row.createdAt.toISOString(),
  readAt: row.readAt?.toISOString() ?? null,
});
export type NoticeView = ReturnType<typeof view>;

/** What the reader was told, the newest first. */
export const listNotices = defineRead({
  name: 'list.notice',
  doing: 'see your notices',
  roles: PERMITTED['own-settings'],
  input: listNoticesInput,
  run: async ({ tx, ctx, input: { page } }) => {
    const owner = { organisationId: ctx.organisation.id, personId: ctx.person.id };
    const total = await countNotices(tx, owner);
    const pageCount = Math.max(1, Math.ceil(total / ROWS_A_PAGE));
    const shown = Math.min(page, pageCount);
    const rows = await selectNotices(tx, { ...owner, limit: ROWS_A_PAGE, offset: (shown - 1) * ROWS_A_PAGE });
    return { rows: rows.map(view), unread: await countNotices(tx, { ...owner, isUnread: true }), total, page: shown, pageCount };
  },
});

/** The same, one page after another. */
export const browseNotices = defineRead({
  name: 'browse.notice',
  doing: 'see your notices',
  roles: PERMITTED['own-settings'],
  input: browseNoticesInput,
  run: async ({ tx, ctx, input: { unread, limit, cursor } }) => {
    const owner = { organisationId: ctx.organisation.id, personId: ctx.person.id };
    const found = await selectNotices(tx, { ...owner, isUnread: unread, limit: limit + 1, after: cursor });
    const { rows, next } = cutPage(found, { limit, keysOf: ({ createdAt, id }) => [createdAt.toISOString(), id] });
    return { notices: rows.map(view), next };
  },
});

/** How many the reader has not read. */
export const countUnread = defineRead({
  name: 'count.notice',
  doing: 'see your notices',
  roles: PERMITTED['own-settings'],
  input: z.strictObject({}),
  run: ({ tx, ctx }) => countNotices(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id, isUnread: true }),
});
