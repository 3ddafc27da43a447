import { ANYONE } from '@/lib/auth/roles';
import { createToken } from '@/lib/services/token/create';
import { feature } from '../row';

const PAGE = '(signed-in)/settings/tokens';

export const tokens = feature({
  async prepare({ as }) {
    const { id } = await createToken({ ctx: as('technician'), input: { name: 'Mileage', scopes: ['units:write'], days: 30 } });
    return { tokenId: id };
  },
  rows: [
    { page: PAGE, roles: ANYONE },
    { action: PAGE, name: 'makeToken', roles: ANYONE, form: () => ({ name: 'Nightly', scopes: ['units:read', 'sites:read'], days: '90' }) },
    { action: PAGE, name: 'endToken', roles: ANYONE, form: ({ tokenId }) => ({ tokenId }) },
  ],
});
