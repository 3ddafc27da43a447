import type { SearchGroup } from '@/lib/schemas/search-result';

export const GROUP_NAMES: Readonly<Record<SearchGroup['kind'], string>> = { units: 'Units', cases: 'Cases', notes: 'Notes', rulebook: 'Rulebook' };

const COUNTED: Readonly<Record<SearchGroup['kind'], readonly [one: string, several: string]>> = {
  units: ['unit', 'units'],
  cases: ['case', 'cases'],
  notes: ['note', 'notes'],
  rulebook: ['entry of the rulebook', 'entries of the rulebook'],
};

/** What is found, counted: "2 units, 1 note". */
export function foundText(groups: readonly SearchGroup[]): string {
  const some = groups.filter(({ total }) => total > 0).map(({ kind, total }) => `${total} ${COUNTED[kind][total === 1 ? 0 : 1]}`);
  return some.length > 0 ? `Found: ${some.join(', ')}` : 'Nothing is found';
}

export const SEARCHED = 'Units, cases, notes, rulebook';

export const OFFLINE = 'No connection to Carryover, which is where the search is done. The open cases that this device keeps are under Cases.';
