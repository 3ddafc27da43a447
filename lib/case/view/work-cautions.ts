import { cautionsToRead } from '@/lib/diagnose/cautions';
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import type { Check } from '@/lib/diagnose/types';

interface Unread {
  cautions: { id: string; text: string }[];
  /** Those that the reader has still to acknowledge today. */
  toRead: string[];
}

/** The cautions of a piece of work in words, and which of them this person has still to read today. */
export function unreadOf({ rulebook }: Pick<CompiledRulebook, 'rulebook'>, work: Pick<Check, 'cautions' | 'setUp'>, acknowledged: Parameters<typeof cautionsToRead>[2]): Unread {
  const known = new Map(rulebook.cautions.map((caution) => [caution.id, caution]));
  return {
    cautions: work.cautions.map((id) => ({ id, text: known.get(id)?.text ?? id })),
    toRead: cautionsToRead(work, (id) => known.get(id)?.worseWhen ?? [], acknowledged),
  };
}
