import { may, PERMITTED } from '@/lib/auth/permissions';
import { searchInput } from '@/lib/schemas/search';
import type { SearchGroup, SearchResult } from '@/lib/schemas/search-result';
import { readAsked } from '@/lib/search/asked';
import { defineRead } from '../define';
import { searchCases } from './cases';
import { searchNotes } from './notes';
import { searchRulebook } from './rulebook';
import { searchUnits } from './units';

/** Units, cases, notes and the rulebook from one box: of each kind what the person's role may see. */
export const searchEverywhere = defineRead({
  name: 'search.everywhere',
  doing: 'search',
  roles: PERMITTED['unit.see'],
  input: searchInput,
  run: async ({ tx, ctx, input: { q, limit } }): Promise<SearchResult> => {
    const seesCases = may(ctx.roles, 'case.see');
    const search = { tx, organisationId: ctx.organisation.id, q, asked: readAsked(q), limit, seesCases };
    const units = await searchUnits(search);
    const groups: SearchGroup[] = [units.group];
    if (seesCases) groups.push(await searchCases(search, units.meant));
    groups.push(await searchNotes(search));
    if (seesCases) groups.push(await searchRulebook(search));
    return { q, groups };
  },
});
