import { z } from 'zod';
import { selectNoticeChoices, upsertNoticeChoices } from '@/db/queries/notice';
import { PERMITTED } from '@/lib/auth/permissions';
import { setNoticesInput, USUAL_BY_MAIL } from '@/lib/schemas/notice';
import { defineRead, defineWrite } from '../define';

/** How the reader is told by mail, kind by kind. */
export const readNoticeChoices = defineRead({
  name: 'see.notice-choices',
  doing: 'see your own settings',
  roles: PERMITTED['own-settings'],
  input: z.strictObject({}),
  run: async ({ tx, ctx }) => ({ ...USUAL_BY_MAIL, ...(await selectNoticeChoices(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id })) }),
});

/** Sets it, in this organisation. What happened before goes as it was set then. */
export const setNotices = defineWrite({
  name: 'set-notices.person',
  doing: 'choose how you are told',
  roles: PERMITTED['own-settings'],
  input: setNoticesInput,
  run: async ({ tx, ctx, input: byMail, audit }) => {
    await upsertNoticeChoices(tx, { organisationId: ctx.organisation.id, personId: ctx.person.id, byMail });
    audit({ entity: 'person', entityId: ctx.person.id, changed: byMail });
  },
});
