import type { Stage } from './types';

/** A stage as one text: "diagnosis", "after-remedy 2". Equal stages give equal texts. */
export function stageKey(stage: Stage): string {
  return stage.kind === 'after-remedy' ? `after-remedy ${stage.remedy}` : stage.kind;
}

const ORDER = ['diagnosis', 'after-remedy', 'release', 'watch'] as const;

/** Compares two stages in the order in which a case passes through them. */
export function byStage(a: Stage, b: Stage): number {
  const remedyOf = (stage: Stage) => (stage.kind === 'after-remedy' ? stage.remedy : 0);
  return ORDER.indexOf(a.kind) - ORDER.indexOf(b.kind) || remedyOf(a) - remedyOf(b);
}
