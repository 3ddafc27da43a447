import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { openChecks } from '@/lib/diagnose/next-checks-open';
import { whatWouldSettle } from '@/lib/diagnose/next-checks-settle';
import type { RankOptions } from '@/lib/diagnose/rank';
import type { Finding } from '@/lib/diagnose/types';
import { createWhatIf } from '@/lib/diagnose/what-if';
import type { SettleView } from '@/lib/schemas/case-view';

/** Of this many leading causes it is said what would settle them. */
const LEADING = 3;

/** For each leading cause the answer that would move it most, either way. */
export function whatSettles(compiled: CompiledRulebook, findings: readonly Finding[], options: RankOptions): SettleView[] {
  const open = openChecks(createWhatIf(compiled, findings, options), findings, options.stages);
  const labelOf = (checkId: string, state: string) => compiled.checks.get(checkId)?.check.states.find(({ id }) => id === state)?.label ?? state;
  return whatWouldSettle(open)
    .causes.slice(0, LEADING)
    .flatMap(({ causeId, p, up, down }) => {
      const telling = up && (!down || up.then - p >= p - down.then) ? up : down;
      return telling ? [{ checkId: telling.checkId, answer: labelOf(telling.checkId, telling.state), causeId, from: p, to: telling.then }] : [];
    });
}
