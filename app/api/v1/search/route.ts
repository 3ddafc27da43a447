import { route } from '@/lib/auth/route';
import { searchResult } from '@/lib/openapi/answers/search';
import { searchEverywhere } from '@/lib/services/search/everywhere';

export const GET = route(searchEverywhere, {
  scope: 'search:read',
  doc: {
    summary: 'Search',
    description: 'Units, and for those who see cases also cases, what was written in them, and the remedies, checks and causes of the rulebook in force.',
    answers: searchResult,
  },
});
