import type { CaseView } from '@/lib/schemas/case-view';

export interface Step {
  /** The instant up to which this step counts. */
  at: string;
  /** All that happened at it. */
  what: string;
}

/** A case's moments as steps that can be told apart: what came at the same instant is one of them. */
export function stepsOf(moments: CaseView['moments']): Step[] {
  const steps: Step[] = [];
  for (const { at, what } of moments) {
    const last = steps.at(-1);
    if (last?.at === at) last.what = `${last.what}; ${what}`;
    else steps.push({ at, what });
  }
  return steps;
}

/** The step that held at an instant: the last that isn't after it, or else the first. */
export function stepAt(steps: readonly Step[], at: string | null): number {
  if (at === null) return steps.length - 1;
  return Math.max(0, steps.findLastIndex((step) => Date.parse(step.at) <= Date.parse(at)));
}
