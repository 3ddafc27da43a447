/**
 * Textbook problems as rulebooks: each cause is one state of the world, each check one thing that may be seen, and every
 * weight is 10 log10(P(v | c) / b_v) with b_v = sum_c pi_c P(v | c). With rho = 1 and beta = 1 the production ranker
 * must then give Bayes' rule to the digit.
 */
import {
  compileRulebook, createWhatIf, decibansOf, rank, SOMETHING_ELSE,
  type Check, type CompiledRulebook, type Condition, type Finding, type Rule, type RulebookSettings, type StateShare,
} from '@/lib/diagnose';
import { openChecks } from '@/lib/diagnose/next-checks-open';

/** Every rulebook lists "something else"; no textbook does. So it gets a prior that no digit asked for can see. */
const NO_PRIOR = 1e-14;
/** Decibans for what can't happen: a chance of 1e-300, since a weight must be finite. */
const IMPOSSIBLE = -3000;

export interface Band {
  low?: number;
  high?: number;
}

export interface Textbook {
  /** P(cause). */
  causes: Record<string, number>;
  /** By check, by answer: P(v | c) for each cause, in the order of the causes. */
  checks: Record<string, Record<string, readonly number[]>>;
  /** Of measured checks: the band of each answer. */
  bands?: Record<string, Record<string, Band>>;
}

/** Naive Bayes; what money and minutes are does not matter here. */
export const NAIVE: RulebookSettings = {
  beta: 1,
  defaultRho: 1,
  defaultReliability: 0.8,
  labourRatePerHour: 60,
  serviceCost: 1000,
  comebackCost: 0,
  setUpMinutes: {
    engine: { off: 0, idle: 0, governed: 0 },
    air: { full: 0, empty: 0 },
    heat: { hot: 0, cold: 0 },
    brakes: { released: 0, applied: 0 },
    access: { 'wheels-chocked': 0, 'cab-tilted': 0, 'panels-off': 0, 'line-open': 0, 'head-off': 0, 'compressor-off': 0 },
  },
};

/** The causes of a problem with "something else" beside them. */
export function causesWithElse(causes: Record<string, number>) {
  const cause = (id: string, prior: number) => ({ id, station: null, name: id, sentence: id, prior, basis: 'judgement' as const });
  return [...Object.entries(causes).map(([id, p]) => cause(id, p * (1 - NO_PRIOR))), cause(SOMETHING_ELSE, NO_PRIOR)];
}

/** A check with the fields that a textbook leaves out. */
export function checkOf(id: string, states: Check['states'], measured = false): Check {
  return {
    id, station: 'vehicle-and-history', kind: measured ? 'measured' : 'choice',
    ...(measured ? { quantity: 'ratio', unit: 'of its own', range: { min: 0, max: 1000 }, usualError: 0 } : {}),
    name: 'Sight', prompt: 'What do you see?', why: 'A textbook asks.', steps: [], tools: [], minutes: 1, setUp: {}, spoils: [], cautions: [],
    states, cannotTell: 0, basis: 'judgement',
  };
}

export function textbook({ causes, checks, bands = {} }: Textbook): CompiledRulebook {
  const ids = Object.keys(causes);
  const priors = Object.values(causes);
  const rules: Rule[] = [];
  const written = Object.entries(checks).map(([checkId, table]) => {
    const states = Object.entries(table).map(([answer, given]) => {
      const background = given.reduce((sum, p, c) => sum + p * (priors[c] ?? NaN), 0);
      const band = bands[checkId]?.[answer];
      rules.push({
        name: `${checkId} is ${answer}`,
        conditions: { all: band ? inBand(checkId, band) : [{ fact: checkId, operator: 'equal', value: answer }] },
        weights: Object.fromEntries(ids.map((id, c) => [id, weight(given[c] ?? NaN, background)])),
        note: 'From a textbook.',
        basis: 'judgement',
      });
      return { id: answer, label: answer, background, ...band };
    });
    return checkOf(checkId, states, bands[checkId] !== undefined);
  });
  return compileRulebook({
    schemaVersion: 1, title: 'A textbook problem', settings: NAIVE, causes: causesWithElse(causes), checks: written,
    panels: [], evidenceGroups: [], rules, remedies: [], cautions: [],
  });
}

function inBand(fact: string, { low, high }: Band): Condition[] {
  return [
    ...(low === undefined ? [] : [{ fact, operator: 'greaterThanInclusive' as const, value: low }]),
    ...(high === undefined ? [] : [{ fact, operator: 'lessThan' as const, value: high }]),
  ];
}

const weight = (given: number, background: number): number =>
  given === 0 ? IMPOSSIBLE : decibansOf(Math.log(given / background));

/** A finding: one answer, or shares of several; an empty list is "can't tell". */
export function found(checkId: string, answer: string | StateShare[], reliability = 1): Finding {
  const shares = typeof answer === 'string' ? [{ state: answer, share: 1 }] : answer;
  return { id: `finding-of-${checkId}`, checkId, stage: { kind: 'diagnosis' }, shares, reliability };
}

/** P of all causes whose id passes, as the production ranker has it. */
export function probability(book: CompiledRulebook, findings: readonly Finding[], holds: (causeId: string) => boolean): number {
  return rank(book, findings).causes.reduce((sum, { causeId, p }) => sum + (holds(causeId) ? p : 0), 0);
}

/** P_v of an answer that nobody has given yet, as the production forecast has it. */
export function chance(book: CompiledRulebook, findings: readonly Finding[], checkId: string, answer: string): number {
  const open = openChecks(createWhatIf(book, findings), findings).checks.get(checkId);
  const state = book.checks.get(checkId)?.stateIndex.get(answer);
  return open?.forecast.chances[state ?? -1] ?? NaN;
}
