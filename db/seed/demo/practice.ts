import type { Row } from './rows';
import type { DemoModel } from './compressor-models';
import type { Site } from './organisation';
import type { Random } from './random';

/** How a compressor was fitted: what is so, and what of it was written down. */
export type Practice = Pick<
  Row<'fit'>,
  'condition' | 'sealant' | 'dischargeLine' | 'governor' | 'feedLine' | 'intakeHose' | 'dryerCartridge' | 'driveGear' | 'systemCleaned' | 'breakInRun'
>;

/** Shares of fits without a break-in run, and with a heavy bead of sealant, at every site alike. */
export const SKIPS_BREAK_IN = 0.5;
const SEALANTS = { none: 24, 'thin-film': 32, 'spray-adhesive': 10, 'heavy-bead': 34 };

const NOT_WRITTEN_DOWN = 0.1;

export function practiceAt(site: Site, random: Random): Practice {
  const changed = (p: number) => (random.chance(p) ? 'changed' : 'kept');
  return {
    condition: random.chance(0.58) ? 'new' : 'rebuilt',
    sealant: random.weighted(SEALANTS),
    dischargeLine: changed(1 - site.keepsOldLine),
    governor: changed(0.45),
    feedLine: changed(0.4),
    intakeHose: changed(0.35),
    dryerCartridge: changed(0.45),
    driveGear: changed(0.5),
    systemCleaned: random.chance(0.3) ? 'yes' : 'no',
    breakInRun: random.chance(SKIPS_BREAK_IN) ? 'no' : 'yes',
  };
}

/** The compressor that a vehicle was built with: nothing was kept, and nobody wrote down how it was fitted. */
export const AS_BUILT: Practice = {
  condition: 'new',
  sealant: null,
  dischargeLine: null,
  governor: null,
  feedLine: null,
  intakeHose: null,
  dryerCartridge: null,
  driveGear: null,
  systemCleaned: null,
  breakInRun: null,
};

/** What of it stands in the record: now and then a field is left out, or nobody knew. */
export function writtenDown(practice: Practice, random: Random): Practice {
  const known = <T>(value: T) => (random.chance(NOT_WRITTEN_DOWN) ? null : value);
  return {
    condition: practice.condition,
    sealant: practice.sealant && random.chance(0.12) ? 'unknown' : known(practice.sealant),
    dischargeLine: known(practice.dischargeLine),
    governor: known(practice.governor),
    feedLine: known(practice.feedLine),
    intakeHose: known(practice.intakeHose),
    dryerCartridge: known(practice.dryerCartridge),
    driveGear: known(practice.driveGear),
    systemCleaned: known(practice.systemCleaned),
    breakInRun: known(practice.breakInRun),
  };
}

export interface Fate {
  causeId: string;
  /** Days after the fit. */
  after: number;
}

/** Chance that sealant chokes the drain within days of a fit: planted, and nearly all of it at the small hole. */
export const CHOKES = {
  'small-hole': { 'heavy-bead': 0.75, other: 0.03 },
  'large-cavity': { 'heavy-bead': 0.06, other: 0.004 },
};
/** Chance that the rings don't seat, by whether it was run in. */
export const DOES_NOT_SEAT = { yes: 0.015, no: 0.16 };
/** Chance that a line which was kept closes within some months; it grows with the miles that the line has on it. */
export const KEPT_LINE_CLOSES = { atLeast: 0.3, more: 0.3, overMiles: 300_000 };

/** What the way it was fitted brings on early. */
export function earlyFates(practice: Practice, model: DemoModel, lineMiles: number, random: Random): Fate[] {
  const chokes = CHOKES[model.drainOpening][practice.sealant === 'heavy-bead' ? 'heavy-bead' : 'other'];
  const seats = practice.breakInRun === 'no' ? DOES_NOT_SEAT.no : DOES_NOT_SEAT.yes;
  const { atLeast, more, overMiles } = KEPT_LINE_CLOSES;
  const closes = practice.dischargeLine === 'kept' ? atLeast + more * Math.min(1, lineMiles / overMiles) : 0.005;
  const drawn: [boolean, Fate][] = [
    [random.chance(chokes), { causeId: 'drain-choked-by-sealant', after: random.whole(0, 8) }],
    [random.chance(seats), { causeId: 'rings-not-seated', after: random.whole(4, 55) }],
    [random.chance(closes), { causeId: 'discharge-line-carboned', after: random.whole(8, 110) }],
  ];
  return drawn.flatMap(([happens, fate]) => (happens ? [fate] : []));
}
