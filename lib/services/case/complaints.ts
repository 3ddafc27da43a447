import type { CompiledRulebook, Finding } from '@/lib/diagnose';

/** The panel whose checks are the coded complaints: a rulebook keeps it under this id. */
const PANEL = 'complaints';

/** Ids of the complaints that can be chosen when a case is opened. */
export function complaintIds({ rulebook }: CompiledRulebook): readonly string[] {
  return rulebook.panels.find(({ id }) => id === PANEL)?.checks ?? [];
}

/**
 * The chosen complaints as findings. One that was not chosen stays unanswered: people name what brought them in, not
 * everything that is so.
 */
export const complaintFindings = (chosen: readonly string[]): Omit<Finding, 'id'>[] =>
  chosen.map((checkId) => ({ checkId, stage: { kind: 'diagnosis' }, shares: [{ state: 'yes', share: 1 }], reliability: 1 }));
