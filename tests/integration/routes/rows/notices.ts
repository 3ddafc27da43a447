import { asTenant } from '@/db/connect';
import { selectNotices } from '@/db/queries/notice';
import { ANYONE } from '@/lib/auth/roles';
import { newId } from '@/lib/ids';
import { notify } from '@/lib/services/notice/notify';
import { feature } from '../row';

const PAGE = '(signed-in)/notices';
const SETTINGS = '(signed-in)/settings/notices';
const V1 = 'api/v1';

/** One notice that was not read. */
export const notices = feature({
  async prepare({ as }) {
    const ctx = as('technician');
    const owner = { organisationId: ctx.organisation.id, personId: ctx.person.id };
    const [last] = await asTenant(ctx.db, owner, async (tx) => {
      await notify(tx, ctx, { ...owner, kind: 'assigned', caseId: null, key: newId(), about: {} });
      return selectNotices(tx, { ...owner, limit: 1 });
    });
    return { noticeId: last?.id ?? '' };
  },
  rows: [
    { page: PAGE, roles: ANYONE, query: () => ({ page: '2' }) },
    { action: PAGE, name: 'openNotice', roles: ANYONE, form: ({ noticeId }) => ({ noticeId }) },
    { action: PAGE, name: 'markRead', roles: ANYONE, form: ({ noticeId }) => ({ noticeId }) },
    { action: PAGE, name: 'markAllRead', roles: ANYONE, takesNothing: true, form: () => ({}) },
    { page: SETTINGS, roles: ANYONE },
    { action: SETTINGS, name: 'saveNotices', roles: ANYONE, form: () => ({ assigned: 'daily', 'repair-assigned': 'never', comeback: 'at-once', 'watch-due': 'daily', 'mail-bounced': 'never' }) },

    { route: `${V1}/notices`, method: 'GET', roles: ANYONE, query: () => ({ limit: '1', unread: 'yes' }) },
    { route: `${V1}/notices/[id]/read`, method: 'POST', roles: ANYONE, params: ({ noticeId }) => ({ id: noticeId }) },
    { route: `${V1}/notices/read-all`, method: 'POST', roles: ANYONE },
    { route: `${V1}/profile/notices`, method: 'GET', roles: ANYONE },
    { route: `${V1}/profile/notices`, method: 'PUT', roles: ANYONE, body: () => ({ assigned: 'daily', comeback: 'never' }) },
  ],
});
