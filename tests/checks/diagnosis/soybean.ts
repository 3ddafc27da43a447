/**
 * Soybean (Large) as a rulebook: one json-rules-engine rule for each value of each symptom, weights learned from the
 * first 307 rows, judged over the other 376 by the run of record.
 */
import { compileRulebook, decibansOf, type Check, type CompiledRulebook, type EvidenceGroup, type Finding, type Rule } from '@/lib/diagnose';
import { runOfRecord } from '@/lib/diagnose/record-run';
import { logLoss, multiClassBrier, topClass, topShare, type Prediction } from '@/lib/diagnose/scores';
import { expectedCalibrationError, reliabilityBins } from '@/lib/diagnose/scores-reliability';
import type { ProvedCase } from '@/lib/rulebook/proved-case';
import { readRows, type Proofs } from '../../support/outside-values';
import { causesWithElse, checkOf, found, NAIVE } from './small-rulebook';

type Row = Record<string, string>;
const learned = readRows(new URL('../data/soybean-train.csv', import.meta.url));
export const judged = readRows(new URL('../data/soybean-test.csv', import.meta.url));

const MISSING = '?';
const symptoms = Object.keys(learned[0] ?? {}).filter((column) => column !== 'class');
/** A value or a class as an id: the data set writes "gt-1/8" and "diaporthe-pod-&-stem-blight". */
const idOf = (text: string): string => text.replace(/[^a-z0-9]+/g, '-');
const classOf = (row: Row): string => idOf(row.class ?? '');
const classes = [...new Set(learned.map(classOf))].sort();
/** The data set declares one value that none of its rows has; smoothing counts it. */
const DECLARED: Record<string, string[]> = { 'fruit-spots': ['distort'] };

const valuesOf = (symptom: string): string[] =>
  [...new Set([...learned, ...judged].map((row) => row[symptom] ?? MISSING).concat(DECLARED[symptom] ?? []))]
    .filter((value) => value !== MISSING).sort();

/** The 35 symptom columns in order, as `diagnosis.md` groups them. */
const GROUPS: { id: string; from: number; to: number }[] = [
  { id: 'setting', from: 1, to: 11 },
  { id: 'leaf', from: 12, to: 18 },
  { id: 'stem', from: 19, to: 27 },
  { id: 'fruit-and-seed', from: 28, to: 34 },
  { id: 'root', from: 35, to: 35 },
];

/** Add-one smoothed share of each value among the rows that have one. */
function smoothed(rows: readonly Row[], symptom: string, values: readonly string[]): number[] {
  const answered = rows.filter((row) => row[symptom] !== MISSING);
  return values.map((value) => (answered.filter((row) => row[symptom] === value).length + 1) / (answered.length + values.length));
}

/** P(value | class) of each value of a symptom. */
type Shares = (name: string, symptom: string, values: readonly string[]) => number[];
const counted: Shares = (name, symptom, values) => smoothed(learned.filter((row) => classOf(row) === name), symptom, values);
/** Nobody has counted anything yet. */
export const uniform: Shares = (_name, _symptom, values) => values.map(() => 1 / values.length);

export function soybeanRulebook(rho: number, shares: Shares = counted): CompiledRulebook {
  const evidenceGroups: EvidenceGroup[] = GROUPS.map(({ id }) => ({ id, name: id, rho }));
  const rules: Rule[] = [];
  const checks = symptoms.map((symptom, column): Check => {
    const values = valuesOf(symptom);
    const background = smoothed(learned, symptom, values);
    const given = classes.map((name) => shares(name, symptom, values));
    const group = GROUPS.find(({ from, to }) => column + 1 >= from && column + 1 <= to)?.id;
    values.forEach((value, v) => rules.push({
      name: `${symptom} is ${value}`,
      conditions: { all: [{ fact: symptom, operator: 'equal', value: idOf(value) }] },
      weights: Object.fromEntries(classes.map((name, c) => [name, decibansOf(Math.log((given[c]?.[v] ?? NaN) / (background[v] ?? NaN)))])),
      group,
      note: 'Counted in the first 307 rows.',
      basis: 'judgement',
    }));
    return checkOf(symptom, values.map((value, v) => ({ id: idOf(value), label: value, background: background[v] ?? NaN })));
  });
  const count = (name: string): number => learned.filter((row) => classOf(row) === name).length;
  return compileRulebook({
    schemaVersion: 1, title: 'Soybean diseases', settings: NAIVE,
    causes: causesWithElse(Object.fromEntries(classes.map((name) => [name, (count(name) + 1) / (learned.length + classes.length)]))),
    checks, panels: [], evidenceGroups, rules, remedies: [], cautions: [],
  });
}

export interface Judgement {
  predictions: Prediction[];
  /** Runs in which engine and compiled predicates fired the same rules. */
  agreed: number;
}

const findingsOf = (row: Row): Finding[] =>
  symptoms.flatMap((symptom) => {
    const value = row[symptom] ?? MISSING;
    return value === MISSING ? [] : [found(symptom, idOf(value))];
  });

/** The first 307 rows as cases whose cause was proved. */
export const learnedCases = (): ProvedCase[] =>
  learned.map((row, index) => ({ id: `row-${index + 1}`, truth: classOf(row), findings: findingsOf(row) }));

export async function judge(compiled: CompiledRulebook): Promise<Judgement> {
  const predictions: Prediction[] = [];
  let agreed = 0;
  for (const row of judged) {
    const run = await runOfRecord(compiled, findingsOf(row));
    if (run.agreed) agreed += 1;
    const p = new Map(run.ranking.causes.map((cause) => [cause.causeId, cause.p]));
    predictions.push({ p: classes.map((name) => p.get(name) ?? NaN), truth: classes.indexOf(classOf(row)) });
  }
  return { predictions, agreed };
}

const done = new Map<number, Promise<Judgement>>();
/** All 376 rows through the run of record, once for each rho. */
export function judgement(rho: number): Promise<Judgement> {
  const running = done.get(rho) ?? judge(soybeanRulebook(rho));
  done.set(rho, running);
  return running;
}

export const errors = (predictions: readonly Prediction[]): number =>
  Math.round(predictions.length * (1 - topShare(predictions, 1)));
const ece = (predictions: readonly Prediction[]): number =>
  expectedCalibrationError(reliabilityBins(topClass(predictions), 10)) ?? NaN;

export const soybean: Proofs = {
  D02: async () => errors((await judgement(1)).predictions),
  D03: async () => logLoss((await judgement(1)).predictions),
  D04: async () => multiClassBrier((await judgement(1)).predictions),
  D10: async () => ece((await judgement(1)).predictions),
  D11: async () => ece((await judgement(0.5)).predictions),
};
