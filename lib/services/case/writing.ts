import type { Ctx } from '../context';
import { decimalMarkOf } from '../units-of-measure';
import type { Writing } from '@/lib/bench/read-texts';

/** How this person writes measures: the units that he or she set, the decimal mark of the organisation's country. */
export const writingOf = ({ person, organisation }: Pick<Ctx, 'person' | 'organisation'>): Writing => ({
  units: person.units,
  decimal: decimalMarkOf(organisation.country),
});
