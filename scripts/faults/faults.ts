/** One deliberate mistake in a copy of the production source, which the tests named must notice. */
export interface Fault {
  name: string;
  /** In lib/diagnose. */
  file: string;
  /** Text that stands there exactly once; when the source moves on, the fault must too. */
  find: string;
  replace: string;
  /** In tests/unit/diagnose/core: at least one of their tests must turn red. */
  tests: readonly string[];
}

const PROPERTIES = ['properties.test.ts'];
const ANSWERS = ['answers.test.ts'];

export const FAULTS: readonly Fault[] = [
  {
    name: 'rho ignored',
    file: 'attenuation.ts',
    find: 'sum += rho ** to;',
    replace: 'sum += 1;',
    tests: PROPERTIES,
  },
  {
    name: 'sort reversed: the weakest of a group counts whole',
    file: 'attenuation.ts',
    find: '.sort((a, b) => b.size - a.size)',
    replace: '.sort((a, b) => a.size - b.size)',
    tests: PROPERTIES,
  },
  {
    name: 'equal weights not sharing their factors',
    file: 'attenuation.ts',
    find: 'ranked[to]?.size === ranked[from]?.size',
    replace: 'to === from',
    tests: PROPERTIES,
  },
  {
    name: 'prior tempered',
    file: 'rank.ts',
    find: 'Math.log(priors[cause] ?? 0)',
    replace: 'compiled.settings.beta * Math.log(priors[cause] ?? 0)',
    tests: PROPERTIES,
  },
  {
    name: 'evidence not tempered',
    file: 'rank.ts',
    find: 'countedNats: beta * (factors.get(item) ?? 1) * weightNats',
    replace: 'countedNats: (factors.get(item) ?? 1) * weightNats',
    tests: PROPERTIES,
  },
  {
    name: 'negative weights dropped',
    file: 'rank.ts',
    find: 'item.nats[cause] !== 0',
    replace: '(item.nats[cause] ?? 0) > 0',
    tests: PROPERTIES,
  },
  {
    name: 'scores not brought down before exp',
    file: 'log-sum-exp.ts',
    find: 'const top = scores.reduce((a, b) => Math.max(a, b), -Infinity);',
    replace: 'const top = 0;',
    tests: PROPERTIES,
  },
  {
    name: 'think-so answered as sure',
    file: 'shares.ts',
    find: "answer.sureness === 'sure' ? 1 : check.reliability",
    replace: '1',
    tests: ANSWERS,
  },
  {
    name: 'think-so counted as sure',
    file: 'contributions.ts',
    find: 'if (reliability === 1 && nats.length === 1) return first;',
    replace: 'if (nats.length === 1) return first;',
    tests: ANSWERS,
  },
  {
    name: 'split shares ignored: every band counts alike',
    file: 'contributions.ts',
    find: '(shares[state] ?? 0)',
    replace: '(1 / nats.length)',
    tests: ANSWERS,
  },
  {
    name: 'bands closed on the wrong side',
    file: 'shares.ts',
    find: 'value >= low && value < high',
    replace: 'value > low && value <= high',
    tests: ANSWERS,
  },
  {
    name: 'fill weights dropped: an answer without a rule tells nothing',
    file: 'evidence.ts',
    find: '?? check.fill[cause] ?? 0',
    replace: '?? 0',
    tests: PROPERTIES,
  },
  {
    name: 'tables not normalised where every answer is given',
    file: 'complete-table.ts',
    find: 'excess: Math.log(total), fill: 0',
    replace: 'excess: 0, fill: 0',
    tests: PROPERTIES,
  },
  {
    name: 'unknown answers counted: conditions hold on them',
    file: 'predicates.ts',
    find: 'return found !== undefined && test(found);',
    replace: "return test(found ?? '');",
    tests: PROPERTIES,
  },
  {
    name: 'unknown answers counted by the engine',
    file: 'record-run.ts',
    find: "(found, value) => found !== value, isKnown)",
    replace: "(found, value) => found !== value)",
    tests: ['record-run.test.ts'],
  },
  {
    name: 'compound rules see the smallest share',
    file: 'dominant-state.ts',
    find: 'state.share > best.share',
    replace: 'state.share < best.share',
    tests: ANSWERS,
  },
  {
    name: 'compound rules see the upper band in a tie',
    file: 'dominant-state.ts',
    find: 'state.share > best.share',
    replace: 'state.share >= best.share',
    tests: ANSWERS,
  },
  {
    name: 'compound rules surer than their findings',
    file: 'evidence.ts',
    find: 'product * finding.reliability',
    replace: 'product',
    tests: ANSWERS,
  },
  {
    name: 'stages mixed',
    file: 'used-findings.ts',
    find: '&& wanted.has(stageKey(finding.stage))',
    replace: '',
    tests: ANSWERS,
  },
  {
    name: 'what-ifs deaf to their group',
    file: 'attenuation.ts',
    find: 'return own * size - (1 - rho) * pushedDown;',
    replace: 'return size;',
    tests: ['what-if.test.ts'],
  },
  {
    name: 'leave-one-out leaves nothing out',
    file: 'leave-one-out.ts',
    find: 'items.filter(({ findingIds }) => !findingIds.includes(left.finding.id))',
    replace: 'items',
    tests: ['explain.test.ts'],
  },
  {
    name: 'a difference from the engine hushed up',
    file: 'record-run.ts',
    find: 'return engineOnly.length + compiledOnly.length > 0 ?',
    replace: 'return engineOnly.length + compiledOnly.length > 99 ?',
    tests: ['record-run.test.ts'],
  },
];
