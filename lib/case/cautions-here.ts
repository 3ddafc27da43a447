import { cautionsToRead } from '@/lib/diagnose/cautions';
import type { CaseView, CheckView } from '@/lib/schemas/case-view';

/** What of a check's cautions is shown where it stands on a page with others. */
export interface CautionsHere {
  /** All that its reader still has to read before it, wherever on the page they stand. */
  toRead: string[];
  /** Those of them that no check above asks for. */
  askedHere: string[];
  /** Those that were read today and that no check above shows. */
  remindedHere: string[];
}

type Of = Pick<CheckView, 'cautions' | 'setUp'>;
interface View {
  rulebook: Pick<CaseView['rulebook'], 'cautions'>;
  state: Pick<CaseView['state'], 'acknowledged'>;
}

/**
 * The cautions of a check below others: each is shown once, at the first check that has it, because nobody reads the same list
 * five times. None is left out: what is still to be read is asked for at the first check that needs it.
 *
 * @param view the cautions of the rulebook, and what the reader has acknowledged in this case today
 * @param above the checks that stand above it on the page
 */
export function cautionsHere({ rulebook, state }: View, check: Of, above: readonly Of[] = []): CautionsHere {
  const toReadFor = (one: Of) => cautionsToRead(one, (id) => rulebook.cautions[id]?.worseWhen ?? [], state.acknowledged);
  const toRead = toReadFor(check);
  const asked = new Set(above.flatMap(toReadFor));
  const reminded = new Set(above.flatMap((one) => one.cautions.filter((id) => !toReadFor(one).includes(id))));
  return {
    toRead,
    askedHere: toRead.filter((id) => !asked.has(id)),
    remindedHere: check.cautions.filter((id) => !toRead.includes(id) && !reminded.has(id)),
  };
}
