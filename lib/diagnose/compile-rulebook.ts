import { compileTrusted } from './compile';
import type { CompiledRulebook } from './compiled';
import type { Rulebook } from './types';

/**
 * Checks a rulebook and compiles it.
 *
 * @param rulebook a rulebook from anywhere
 * @returns the rulebook made ready to rank
 * @throws RulebookError that carries every problem found
 * @example rank(compileRulebook(defaultRulebook), findings)
 */
export function compileRulebook(rulebook: Rulebook): CompiledRulebook {
  return compileTrusted(rulebook);
}
