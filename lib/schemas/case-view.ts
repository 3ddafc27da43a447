import type { StationId } from '@/lib/diagnose/stations';
import type { Basis, Check, Ranking, SetUp, Stage, StateShare } from '@/lib/diagnose/types';

/**
 * What the case page and the API show of a case. `CaseHead` and `RulebookView` stay as they are while answers come
 * in; `CaseState` is what each answer changes, and what the answer's request returns; `CaseReasons` explain it.
 */
export interface CaseHead {
  id: string;
  number: number;
  unit: { id: string; fleetNumber: string; vehicleKind: string };
  siteName: string;
  timeZone: string;
  fit: { modelName: string; installedOn: string } | null;
  complaintWords: string | null;
  odometer: string | null;
  openedBy: string;
  openedAt: string;
  editionNumber: number;
}

/** A check as the page needs it: everything but its rates. */
export interface CheckView
  extends Pick<Check, 'id' | 'station' | 'kind' | 'name' | 'prompt' | 'why' | 'steps' | 'tools' | 'minutes' | 'setUp' | 'cautions' | 'basis' | 'source'> {
  answers: { id: string; label: string }[];
  /** Symbols of the units that a value and its error are in when none is typed: as the person set them. */
  unitSymbol: string | null;
  errorSymbol: string | null;
  /** Usual error of the instrument in that unit, as text for the field. */
  usualError: string | null;
  /** The sum of the bench that works its value out. */
  sum: string | null;
  /** It can be caught over days and weighed more than once. */
  overDays: boolean;
  /** Checks that this one spoils. */
  spoils: { id: string; name: string }[];
}

export interface RulebookView {
  checks: Record<string, CheckView>;
  panels: { id: string; station: StationId; title: string; prompt: string; checks: string[] }[];
  causes: Record<string, { name: string; sentence: string; station: StationId | null }>;
  cautions: Record<string, { text: string; worseWhen: string[] }>;
}

export type Direction = 'for' | 'against';

/** What one finding counted for or against a cause, and what the ranking would be without it. */
export interface ReasonView {
  findingIds: string[];
  /** "Sealant at the mounting gasket: heavy bead" */
  finding: string;
  direction: Direction;
  strength: string;
  decibans: number;
  note: string;
  basis: Basis | null;
  source: string | null;
  /** p of this cause without this finding. */
  without: number;
}

export interface CauseView {
  causeId: string;
  p: number;
  /** p less that of the run before; null in the first. */
  change: number | null;
  prior: number;
}

export interface FindingView {
  id: string;
  checkId: string;
  stage: Stage;
  source: string;
  kind: string;
  /** "48 s ± 1 s", "Heavy bead", “Can’t tell” */
  answer: string;
  shares: StateShare[];
  /** The sum of the bench that it came from, with all that went in, as the bench's address takes it. */
  sum: { id: string; search: Record<string, string> } | null;
  /** What the adopted limit says of a measured value, in words; null: judged by none. */
  judgement: { verdict: 'within' | 'out'; text: string } | null;
  /** How it stands to what was usual when it was given, both in words; null: nothing to compare with. */
  compared: string | null;
  thinkSo: boolean;
  person: string;
  /** By the device's corrected clock. */
  at: string;
  receivedAt: string;
  late: boolean;
  current: boolean;
  notes: { id: string; text: string; person: string; at: string; waits?: boolean }[];
  /** It is on this device and not yet on the server. */
  waits?: boolean;
}

export interface SuggestionView {
  checkIds: string[];
  panelId: string | null;
  word: string;
  bits: number;
  minutes: number;
  setUpMinutes: number;
  /** Why it stands where it does, in a sentence; null for a plain suggestion. */
  because: string | null;
}

export interface NextView {
  suggestions: SuggestionView[];
  /** "Enough is known; repair": no check is worth its time any more. */
  stop: boolean;
  stopReason: string | null;
  /** Checks that can't tell any more because another one spoiled what they would have seen. */
  spoiled: { checkId: string; by: string }[];
}

export interface SettleView {
  checkId: string;
  /** The answer that would move the leader most. */
  answer: string;
  causeId: string;
  from: number;
  to: number;
}

export interface RepairView {
  remedyId: string;
  name: string;
  causeIds: string[];
  p: number;
  lookMinutes: number;
  fixMinutes: number;
}

export interface CallView {
  id: string;
  mainCause: string;
  contributingCauses: string[];
  sureness: string;
  proof: string;
  whyNotLeading: string | null;
  unlistedCause: string | null;
  person: string;
  at: string;
  /** The one that stands: not superseded, the case not reopened since. */
  standing: boolean;
}

export interface CaseEventView {
  id: string;
  kind: string;
  reason: string | null;
  person: string;
  at: string;
}

export interface CaseState {
  caseId: string;
  version: number;
  status: 'open' | 'called' | 'closed';
  runId: string | null;
  /** The instant that is shown, when it is not now. */
  at: string | null;
  /** The run can't be made again from what it kept, or the engine and the compiled rules differed. */
  differs: boolean;
  vehicleState: SetUp;
  causes: CauseView[];
  fit: Ranking['fit'];
  suspicion: Ranking['suspicion'];
  /** What moved the ranking last, in words. */
  because: string | null;
  findings: FindingView[];
  next: NextView;
  repairs: RepairView[];
  acknowledged: { cautionId: string; dangers: string[] }[];
  /** Checks whose answer in this case forbids the unit's release. */
  releaseHolds: string[];
}

/** What forbids the unit's release besides what the case itself holds, by the case that found it. */
export interface OtherHoldView {
  caseId: string;
  number: number;
  /** Names of the checks that hold. */
  checks: string[];
  /** Names of those that have passed since: they hold until somebody with the right lifts them. */
  passed: string[];
}

/** A bottle that hangs for a check. */
export interface CatchingView {
  checkId: string;
  since: string;
  remindAt: string | null;
}

/** What a case has to do with repairs that are watched, now. */
export interface WatchingView {
  /** The watch of this case; null: none is under way. */
  own: { until: string; isOver: boolean; next: { check: string; dueOn: string; state: 'waits' | 'due' | 'overdue' } | null } | null;
  /** Of the unit, for other cases, since before this one was opened: this may be their end. */
  others: { caseId: string; number: number; since: string }[];
  /** The case whose repair didn't hold, which this one goes on with. */
  cameBackFrom: { caseId: string; number: number } | null;
}

/**
 * Why the causes stand where they stand, and what would change that. Asked for after the state has come, so that an
 * answer is saved and ranked without waiting for words that are read later, if at all.
 */
export interface CaseReasons {
  /** Of the case when they were worked out: those of an older version are about an older ranking. */
  version: number;
  /** By cause, most telling first. */
  causes: Record<string, ReasonView[]>;
  settle: SettleView[];
  pair: { causeIds: [string, string]; leadDecibans: number } | null;
}

/** Everything that the page is made of at first. */
export interface CaseView {
  /** Who reads it: what is done on this page waits under that name when it can't be sent. */
  reader: { personId: string; organisationId: string };
  head: CaseHead;
  rulebook: RulebookView;
  state: CaseState;
  reasons: CaseReasons;
  /** What is usual for the unit or its model, now, by the checks that compare with it. */
  usual: Record<string, string>;
  /** Other cases of the unit that hold its release, now. */
  otherHolds: OtherHoldView[];
  /** Oil that is being caught for a check, now: since when, and when somebody is reminded of it. */
  catching: CatchingView[];
  watching: WatchingView;
  /** The limits that the organisation adopted for this unit, by check. */
  limits: Record<string, { text: string; source: string }>;
  assignedTo: string | null;
  calls: CallView[];
  events: CaseEventView[];
  /** Instants at which something happened, oldest first: where the past can be shown. */
  moments: { at: string; what: string }[];
}
