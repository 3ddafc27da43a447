/**
 * The shapes of a rulebook as it is written and stored (plain JSON), of the findings that go into a ranking, and of
 * what comes out. Every measured number is SI (Pa, m, K, s, m3, ratio); `Quantity` says which.
 */
import type { StationId } from './stations';

/** The id of the cause that stands for everything that no rule describes. Every rulebook lists it. */
export const SOMETHING_ELSE = 'something-else';
/** The id of the cause "nothing to repair". */
export const NORMAL_CARRYOVER = 'normal-carryover';

/** Where a statement comes from. A judgement says so; a regulation names its paragraph in `source`. */
export type Basis = 'regulation' | 'common practice' | 'judgement';

/** A quantity of lib/units, by its id there: the core takes SI and only passes the name on. */
export type Quantity =
  | 'pressure' | 'pressureRate' | 'vacuum' | 'length' | 'volume' | 'temperature' | 'temperatureDifference'
  | 'duration' | 'distance' | 'oilRate' | 'ratio' | 'count' | 'cycleRate';

// ---------------------------------------------------------------- rulebook

export interface Rulebook {
  schemaVersion: 1;
  title: string;
  settings: RulebookSettings;
  causes: Cause[];
  checks: Check[];
  panels: Panel[];
  evidenceGroups: EvidenceGroup[];
  rules: Rule[];
  remedies: Remedy[];
  cautions: Caution[];
  /** Other priors for a compressor model, vocation or span since the fit; the first that matches is used. */
  priorVariants?: PriorVariant[];
  /** How a repair is proved; left out by rulebooks that end with the call. */
  proof?: Proof;
}

/** How a new compressor is run in, what is measured before a release, and what is watched afterwards. */
export interface Proof {
  fitting: { cautions: string[] };
  breakIn: BreakIn;
  release: ReleasePlan;
  watch: { begin: string[]; plans: WatchPlan[] };
}

/** The first run of a newly fitted compressor: held below cut-in by a bleed, so that it never unloads. */
export interface BreakIn {
  /** Revolutions a minute. */
  engineRpm: number;
  /** Pa; low and high are the band that readings are held against. */
  pressure: { aim: number; low: number; high: number };
  /** s under load. */
  duration: { least: number; most: number };
  cautions: string[];
  basis: Basis;
  source?: string;
}

/** Checks to be measured after the repair, and those that oil which went downstream adds. */
export interface ReleasePlan {
  checks: ReleaseCheck[];
  oilDownstream: { when: { check: string; states: string[] }[]; checks: ReleaseCheck[] };
}

export interface ReleaseCheck {
  check: string;
  /** Answers that pass where the organisation adopted no limit. */
  inOrder: string[];
}

/** What is read while a repair is watched, how often and for how long, for causes; the one without causes is for all others. */
export interface WatchPlan {
  id: string;
  name: string;
  causes: string[];
  readings: WatchReading[];
  /** s; and m where miles count as well: it ends when both are over. */
  duration: number;
  distance?: number;
  basis: Basis;
  source?: string;
}

export interface WatchReading {
  check: string;
  /** Answers that speak for the repair. */
  inOrder: string[];
  /** s; and m: due when either is over. */
  every: number;
  everyDistance?: number;
}

export interface RulebookSettings {
  /** Tempers evidence, never the prior: (0, 1.5]. */
  beta: number;
  /** Attenuation of an evidence group that names none: [0, 1]. */
  defaultRho: number;
  /** Reliability of "think so" where a check names none: (0, 1]. */
  defaultReliability: number;
  /** Money per hour where the organisation gives none. */
  labourRatePerHour: number;
  /** What it costs when nobody in the bay finds the cause: C_service. */
  serviceCost: number;
  /** What a comeback costs, where a repair's success can't be seen in the bay. */
  comebackCost: number;
  /** Minutes to bring the vehicle into a state in which it is not. */
  setUpMinutes: SetUpMinutes;
}

export interface SetUpMinutes {
  engine: Record<'off' | 'idle' | 'governed', number>;
  air: Record<'full' | 'empty', number>;
  heat: Record<'hot' | 'cold', number>;
  brakes: Record<'released' | 'applied', number>;
  access: Record<Access, number>;
}

/** What has to be lifted, turned or opened before a check can be made. Once there it stays. */
export type Access = 'wheels-chocked' | 'cab-tilted' | 'panels-off' | 'line-open' | 'head-off' | 'compressor-off';

/** The state that a check needs; a dimension that is left out does not matter. */
export interface SetUp {
  engine?: 'off' | 'idle' | 'governed';
  air?: 'full' | 'empty';
  heat?: 'hot' | 'cold';
  brakes?: 'released' | 'applied';
  access?: Access[];
}

export interface Cause {
  id: string;
  /** null: sits at no part ("normal carryover", "something else"). */
  station: StationId | null;
  name: string;
  sentence: string;
  /** Share of all cases, (0, 1); the priors of a rulebook sum to 1. */
  prior: number;
  basis: Basis;
  source?: string;
  /** What it costs when this is the truth and nothing is done about it; left out: the service cost. */
  costIfLeft?: number;
}

export interface PriorVariant {
  name: string;
  /** Facts of the record that all must hold: an exact text, or a half-open range [atLeast, below) in SI. */
  when: Record<string, string | { atLeast?: number; below?: number }>;
  /** Priors that replace those of the causes named; the others are scaled so that the sum stays 1. */
  priors: Record<string, number>;
}

/** One answer of a check, or one band of a measured value. */
export interface CheckState {
  id: string;
  label: string;
  /** Background rate b_v: share of this answer over all cases in which the check is answered; they sum to 1. */
  background: number;
  /** Measured checks only: half-open band [low, high) in SI; the first band has no low, the last no high. */
  low?: number;
  high?: number;
  /** The unit is not to be released while this answer stands: true, or left out. */
  holdsRelease?: true;
}

export interface Check {
  id: string;
  station: StationId;
  kind: 'choice' | 'measured';
  /** Measured checks only. */
  quantity?: Quantity;
  /** Measured checks only: unit in which the bands were thought of ("psi", "mm"), to show before anybody's preference. */
  unit?: string;
  /** Measured checks only: usual error of the instrument, SI, offered with the keypad. */
  usualError?: number;
  /** Measured checks only: what can be read at all, SI, inclusive; outside it the entry is refused. */
  range?: { min: number; max: number };
  /** What it is about, as a heading over its answer: "Discharge line bore". */
  name: string;
  /** In the second person. */
  prompt: string;
  why: string;
  steps: string[];
  tools: string[];
  /** Time of the check itself, without its set-up. */
  minutes: number;
  setUp: SetUp;
  /** Checks whose evidence this one destroys. */
  spoils: string[];
  cautions: string[];
  states: CheckState[];
  /** Share of cases in which it can't be answered: [0, 1). */
  cannotTell: number;
  /** Reliability of "think so" for this check; left out: the rulebook's. */
  reliability?: number;
  /** Name of the fact of unit, model or fit that answers it, with the state for each text (a number falls in bands). */
  fromRecord?: { fact: string; states?: Record<string, string> };
  /** Measured checks only: the sum of the bench that works its value out, and which of its outputs that is. */
  sum?: { id: string; output: string };
  /** Measured checks only: the figure of a healthy baseline that its value, or difference, is compared with. Carries no weight. */
  compares?: string;
  basis: Basis;
  source?: string;
}

/** Yes/no checks shown as one screen. */
export interface Panel {
  id: string;
  station: StationId;
  title: string;
  prompt: string;
  checks: string[];
}

export interface EvidenceGroup {
  id: string;
  name: string;
  /** Attenuation in [0, 1]; left out: the rulebook's. */
  rho?: number;
}

export type ConditionOperator =
  | 'equal' | 'notEqual' | 'in' | 'notIn' | 'lessThan' | 'greaterThanInclusive';

/** json-rules-engine's condition, narrowed: `fact` is a check's id, `value` a state of it (or a band edge in SI). */
export interface FactCondition {
  fact: string;
  operator: ConditionOperator;
  value: string | number | string[];
}
export type Condition = FactCondition | { all: Condition[] } | { any: Condition[] };
export type RootCondition = { all: Condition[] } | { any: Condition[] };

export interface Rule {
  /** Unique; the json-rules-engine rule bears it. */
  name: string;
  conditions: RootCondition;
  /** Decibans by cause: 10 log10(P(v | c) / b_v). Never for "something else". */
  weights: Record<string, number>;
  /** Evidence group; left out: a group of its own. All table rules of one check share one. */
  group?: string;
  note: string;
  basis: Basis;
  source?: string;
}

export interface Remedy {
  id: string;
  station: StationId | null;
  name: string;
  causes: string[];
  /** Open, inspect, decide. */
  look: { minutes: number };
  /** 0 minutes where looking already does it. */
  fix: { minutes: number };
  parts: { name: string; cost: number }[];
  /** false: success shows only in the weeks after (oil), so a wrong one costs a comeback. */
  seenInBay: boolean;
  /** Another compressor is fitted: true, or left out. */
  fitsCompressor?: true;
  steps: string[];
  cautions: string[];
  basis: Basis;
  source?: string;
}

export interface Caution {
  id: string;
  text: string;
  /** Acknowledged again when the vehicle enters a state that makes it worse. */
  worseWhen: ('engine-running' | 'brakes-released' | 'system-opened')[];
}

// ---------------------------------------------------------------- findings

export type Stage =
  | { kind: 'diagnosis' }
  | { kind: 'after-remedy'; remedy: number }
  | { kind: 'release' }
  | { kind: 'watch' };

/** What a person answered, before it is turned into shares of states. */
export type Answer =
  | { kind: 'state'; state: string; sureness: 'sure' | 'think-so' }
  | { kind: 'measured'; value: number; error: number; sureness: 'sure' | 'think-so' }
  | { kind: 'cannot-tell' }
  | { kind: 'skip' };

export interface StateShare {
  state: string;
  /** (0, 1]; the shares of a finding sum to 1. */
  share: number;
}

/** A current finding as the ranker sees it: one at most for each check and stage. */
export interface Finding {
  id: string;
  checkId: string;
  stage: Stage;
  /** Empty: can't tell or skipped, which adds nothing. */
  shares: StateShare[];
  /** 1 for sure, r for "think so". */
  reliability: number;
}

/** What unit, compressor model and fit already know, by fact name; numbers in SI. */
export type RecordFacts = Record<string, string | number>;

// ---------------------------------------------------------------- ranking

/** What one finding (or one compound rule) adds to one cause. */
export interface EvidenceTerm {
  kind: 'table' | 'compound';
  findingIds: string[];
  checkIds: string[];
  /** Names of the rules that fired for it; empty when the weight was filled in by the compiler. */
  rules: string[];
  group: string;
  /** W before attenuation and beta, nats. */
  weightNats: number;
  /** What counted: beta x attenuation x W, nats. */
  countedNats: number;
}

export interface RankedCause {
  causeId: string;
  /** Posterior probability. */
  p: number;
  /** S_c = ln prior + sum of what counted. */
  scoreNats: number;
  prior: number;
  terms: EvidenceTerm[];
}

export interface Ranking {
  rankerVersion: string;
  beta: number;
  /** Stages of the findings that were used. */
  stages: Stage[];
  /** Highest first; equal ones by id. */
  causes: RankedCause[];
  /** Names of all rules that fired, sorted. */
  fired: string[];
  fit: { fits: true } | { fits: false; reason: 'something-else-leads' | 'evidence-against-the-leader' };
  /** Suspicion by station; 'none' holds what sits on no part. Sums to 1. */
  suspicion: Record<StationId | 'none', number>;
}
