import { asTenant } from '@/db/connect';
import { selectNotices } from '@/db/queries/notice';
import { ANYONE, ROLES } from '@/lib/auth/roles';
import { newId } from '@/lib/ids';
import { notify } from '@/lib/services/notice/notify';
import { feature } from '../row';

const PAGE = '(signed-in)/notices';
const V1 = 'api/v1';

export const notices = feature({
  async prepare({ as }) {
    const { db, organisation } = as('administrator');
    return { organisationId: organisation.id };
  },
  rows: [],
});
