import { z } from 'zod';
import { findNotice, markNoticesRead } from '@/db/queries/notice';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { noticeInput } from '@/lib/schemas/notice';
import { defineWrite } from '../define';
import { placeOf } from './sentence';

/** Marks one of one's own notices as read, and says where it leads. */
export const readNotice = defineWrite({
  name: 'read.notice',
  doing: 'see your notices',
  roles: PERMITTED['own-settings'],
  input: noticeInput,
  run: async ({ tx, ctx, input: { noticeId }, audit, unchanged }) => {
    const key = { organisationId: ctx.organisation.id, personId: ctx.person.id, noticeId };
    const row = await findNotice(tx, key);
    if (!row) throw notFound('notice');
    if ((await markNoticesRead(tx, { ...key, at: ctx.now() })) > 0) audit({ entity: 'notice', entityId: noticeId, changed: { caseId: row.caseId, isRead: true } });
    else unchanged();
    return { id: noticeId, place: placeOf(row) };
  },
});

/** Marks all of one's own as read. */
export const readAllNotices = defineWrite({
  name: 'read-all.notice',
  doing: 'see your notices',
  roles: PERMITTED['own-settings'],
  input: z.strictObject({}),
  run: async ({ tx, ctx, audit, unchanged }) => {
    const notices = await markNoticesRead(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id, at: ctx.now() });
    if (notices > 0) audit({ entity: 'person', entityId: ctx.person.id, changed: { notices } });
    else unchanged();
    return { read: notices };
  },
});
