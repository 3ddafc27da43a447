import { route } from '@/lib/auth/route';
import { searchUnits } from '@/lib/services/unit/search';

/** Units by part of their number: `?q=K-1&limit=10`. */
export const GET = route(searchUnits);
