import type { CaseState, RulebookView, SuggestionView } from '@/lib/schemas/case-view';

/** What is asked on the screen: one check, with the suggestion that put it there, or a panel of yes/no checks. */
export type AtHand = { kind: 'check'; checkId: string; suggestion: SuggestionView | null } | { kind: 'panel'; panelId: string };

/** What a person picked instead of the suggestion; null follows the suggestion. */
export type Picked = { kind: 'check'; checkId: string } | { kind: 'panel'; panelId: string } | null;

/**
 * What to ask: what was picked, else what tells most, else nothing, because enough is known. A panel that was passed with
 * items left open isn't asked again at once, as long as there is something else to ask.
 */
export function atHand(state: CaseState, rulebook: RulebookView, picked: Picked, passed: ReadonlySet<string>): AtHand | null {
  if (picked?.kind === 'panel') return picked;
  if (picked) return { ...picked, suggestion: null };
  const { suggestions, stop } = state.next;
  const best = suggestions.find(({ panelId }) => panelId === null || !passed.has(panelId)) ?? suggestions[0];
  return best && !stop ? ofSuggestion(best, rulebook) : null;
}

export function ofSuggestion(suggestion: SuggestionView, rulebook: RulebookView): AtHand | null {
  const { checkIds, panelId } = suggestion;
  if (panelId && rulebook.panels.some((panel) => panel.id === panelId)) return { kind: 'panel', panelId };
  const [checkId] = checkIds;
  return checkId ? { kind: 'check', checkId, suggestion } : null;
}
