/**
 * A weight that moves over 10,000 proved cases: the production run of the rule engine on each (A) against the prepared
 * back-test (B). Same result, or it throws.
 */
import { compileRulebook, type Finding } from '@/lib/diagnose';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { moveWeight } from '@/lib/rulebook/back-test/move-weight';
import { prepareCases } from '@/lib/rulebook/back-test/prepare';
import { caseScore, Tally, type Scores } from '@/lib/rulebook/back-test/tally';
import type { ProvedCase } from '@/lib/rulebook/proved-case';
import { withWeight } from '@/tests/support/proved-cases';
import { seededRandom } from '@/tests/support/random';
import { finding } from '@/tests/support/rulebook-parts';
import { benchCase } from './bench-case';

const CASES = 10_000;
const ANSWERED = 20;
const TOLERANCE = 1e-9;

export async function backTest(count = CASES) {
  const { rulebook } = benchCase();
  const compiled = compileRulebook(rulebook);
  const random = seededRandom(11);
  const cases = Array.from({ length: count }, (_, index): ProvedCase => ({
    id: `case-${index}`,
    truth: random.pick(compiled.causeIds),
    findings: random.shuffle(rulebook.checks).slice(0, ANSWERED).map(({ id, states }): Finding => finding(id, random.pick(states).id)),
  }));
  const moved = rulebook.rules.find(({ weights }) => Object.keys(weights).length > 0);
  const [causeId] = Object.keys(moved?.weights ?? {});
  if (!moved || causeId === undefined) throw new Error('no rule weighs anything');

  const started = performance.now();
  const moving = moveWeight(prepareCases(compiled, cases), moved.name, causeId);
  const preparedIn = performance.now() - started;

  async function byEngine(decibans: number): Promise<Scores | undefined> {
    const changed = compileRulebook(withWeight(rulebook, moved?.name ?? '', causeId ?? '', decibans));
    const tally = new Tally();
    for (const { findings, truth } of cases) {
      const { causes } = (await runOfRecord(changed, findings)).ranking;
      const byId = new Map(causes.map((cause) => [cause.causeId, cause]));
      const of = (value: 'p' | 'scoreNats') => changed.causeIds.map((id) => byId.get(id)?.[value] ?? NaN);
      tally.add(caseScore(of('scoreNats'), of('p'), changed.causeIds.indexOf(truth)));
    }
    return tally.scores();
  }
  const byMoving = (decibans: number): Scores | undefined => {
    const at = moving.at(decibans);
    return at.kind === 'moved' ? at.scores : undefined;
  };

  const [slow, fast] = [await byEngine(-4), byMoving(-4)];
  for (const key of ['cases', 'logLoss', 'brier', 'top1', 'top3'] as const) {
    if (!(Math.abs((slow?.[key] ?? NaN) - (fast?.[key] ?? NaN)) < TOLERANCE)) throw new Error(`${key}: ${slow?.[key]} and ${fast?.[key]}`);
  }
  let turn = 0;
  // Another position each time, as a finger on a slider gives.
  const next = () => -6 + ((turn += 1) % 60) / 10;
  return {
    a: () => byEngine(next()),
    b: () => byMoving(next()),
    about: `${count} proved cases, ${rulebook.rules.length} rules; reaches ${moving.reaches}; prepared once in ${preparedIn.toFixed(0)} ms`,
  };
}
