import { compileTrusted } from './compile';
import type { CompiledRulebook } from './compiled';
import { RulebookError } from './errors';
import { parseRulebook } from './schema';
import type { Rulebook } from './types';

/**
 * Checks a rulebook and compiles it.
 *
 * @param rulebook a rulebook from anywhere; it is copied
 * @returns the rulebook made ready to rank
 * @throws RulebookError that carries every problem found
 * @example rank(compileRulebook(defaultRulebook), findings)
 */
export function compileRulebook(rulebook: Rulebook): CompiledRulebook {
  const parsed = parseRulebook(rulebook);
  if (!parsed.ok) throw new RulebookError(parsed.problems);
  return compileTrusted(parsed.rulebook);
}
