import type { CaseState, RulebookView } from '@/lib/schemas/case-view';

/** What is asked on the screen: one check, or a panel of yes/no checks. */
export type AtHand = { kind: 'check'; checkId: string; then: string | null } | { kind: 'panel'; panelId: string };

/** What a person picked instead of the suggestion; null follows the suggestion. */
export type Picked = { kind: 'check'; checkId: string } | { kind: 'panel'; panelId: string } | null;

/** What to ask: what was picked, else what tells most, else nothing, because enough is known. */
export function atHand(state: CaseState, rulebook: RulebookView, picked: Picked): AtHand | null {
  if (picked?.kind === 'panel') return picked;
  if (picked) return { ...picked, then: null };
  const best = state.next.suggestions[0];
  if (!best || state.next.stop) return null;
  return ofSuggestion(best, rulebook);
}

export function ofSuggestion(
  { checkIds, panelId }: { checkIds: string[]; panelId: string | null },
  rulebook: RulebookView,
): AtHand | null {
  if (panelId && rulebook.panels.some((panel) => panel.id === panelId)) return { kind: 'panel', panelId };
  const [checkId, then = null] = checkIds;
  return checkId ? { kind: 'check', checkId, then } : null;
}
