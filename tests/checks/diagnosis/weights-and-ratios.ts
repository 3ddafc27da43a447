import { decibansOf, natsOf, rank, sharesOf, type CompiledRulebook } from '@/lib/diagnose';
import type { Proofs } from '../../support/outside-values';
import { found, probability, textbook } from './small-rulebook';

/** S_a - S_b in decibans: what all findings say for a against b, and the priors with them. */
function ahead(book: CompiledRulebook, findings: Parameters<typeof rank>[1], a: string, b: string): number {
  const score = (id: string) => rank(book, findings).causes.find(({ causeId }) => causeId === id)?.scoreNats ?? NaN;
  return decibansOf(score(a) - score(b));
}

const yesNo = (...yes: number[]) => ({ yes, no: yes.map((p) => 1 - p) });
const two = (prior: number, yesGiven: number, yesElse: number) =>
  textbook({ causes: { it: prior, other: 1 - prior }, checks: { sign: yesNo(yesGiven, yesElse) } });
const after = (book: CompiledRulebook) => probability(book, [found('sign', 'yes')], (id) => id === 'it');

/** Jaynes: a machine that makes 1/3 bad widgets against one that makes 1/6. */
const widgets = textbook({ causes: { a: 1 / 11, b: 10 / 11 }, checks: { bad: yesNo(1 / 3, 1 / 6) } });
const fromPrior = (answer: string) => ahead(widgets, [found('bad', answer)], 'a', 'b') - ahead(widgets, [], 'a', 'b');

const ferritin = two(809 / 2579, 731 / 809, 270 / 1770);

/**
 * The three bands that rows ask for, with their ratios; the bands between are one, its ratio being what makes
 * both columns sum to 1.
 */
const bands = { 'under-15': 51.85, '15-to-25': 8.83, '100-and-over': 0.08 };
const without = { 'under-15': 0.01, '15-to-25': 0.04, '100-and-over': 0.5 };
const middle = 1 - 0.01 - 0.04 - 0.5;
const middleWith = 1 - 0.01 * bands['under-15'] - 0.04 * bands['15-to-25'] - 0.5 * bands['100-and-over'];
const measured = textbook({
  causes: { it: 0.5, other: 0.5 },
  checks: {
    ferritin: {
      'under-15': [without['under-15'] * bands['under-15'], without['under-15']],
      '15-to-25': [without['15-to-25'] * bands['15-to-25'], without['15-to-25']],
      between: [middleWith, middle],
      '100-and-over': [without['100-and-over'] * bands['100-and-over'], without['100-and-over']],
    },
  },
  bands: {
    ferritin: {
      'under-15': { high: 15 },
      '15-to-25': { low: 15, high: 25 },
      between: { low: 25, high: 100 },
      '100-and-over': { low: 100 },
    },
  },
});
function reading(value: number): number {
  const check = measured.checks.get('ferritin');
  if (!check) throw new Error('the check is missing');
  const { shares } = sharesOf(check, { kind: 'measured', value, error: 0, sureness: 'sure' });
  return probability(measured, [found('ferritin', shares)], (id) => id === 'it');
}

export const weightsAndRatios: Proofs = {
  W01: () => fromPrior('yes'),
  W02: () => fromPrior('no'),
  W03: () => ahead(widgets, [], 'a', 'b'),
  W05: () => Math.exp(natsOf(1)),
  W06: () => decibansOf(1),
  L01: () => {
    const table = ferritin.checks.get('sign')?.table[0];
    const of = (id: string) => table?.[ferritin.causeIndex.get(id) ?? -1] ?? NaN;
    return Math.exp(of('it') - of('other'));
  },
  L03: () => after(ferritin),
  L04: () => after(two(0.5, 0.6, 0.1)),
  L05: () => after(two(0.02, 0.9, 0.15)),
  L07: () => reading(14),
  L08: () => reading(15),
  L09: () => reading(100),
  L11: () => after(two(0.15, 0.8, 0.2)),
  L12: () => after(two(0.001, 1, 0.05)),
};
