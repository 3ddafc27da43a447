import type { FitRow } from '@/db/queries/fit';
import type { ModelRow } from '@/db/queries/compressor-model';
import type { ReadingRow } from '@/db/queries/unit-reading';
import type { UnitRow } from '@/db/queries/unit';
import type { RecordFacts } from '@/lib/diagnose';
import type { KnownRecordFacts } from '@/lib/diagnose/default-rulebook/record-facts';
import { daysBetween, yearsBefore } from '../days';
import { runSince } from './run-since';

const DAY_S = 86_400;

/** A sum up to an older reading would say that the unit stood still since. */
const READING_HOLDS_DAYS = 31;

/** A compressor fitted so soon after the vehicle was built is the one that it was built with. */
const FACTORY_FIT_WITHIN_DAYS = 92;

export interface UnitRecord {
  unit: Pick<UnitRow, 'vocation' | 'builtOn' | 'dryerCartridgeChangedOn'>;
  /** All of the unit, in any order. */
  fits: readonly FitRow[];
  /** The model of the current fit. */
  model?: Pick<ModelRow, 'drainOpening' | 'intakeType' | 'driveGear' | 'cooling' | 'oilFeedPlace'>;
  /** By date. */
  readings: readonly ReadingRow[];
}

/** The compressor that was on the unit at the end of a day; undefined when the record has none. */
export const currentFitOn = (fits: readonly FitRow[], on: string): FitRow | undefined =>
  fits
    .filter((fit) => fit.installedOn <= on && (fit.removedOn === null || fit.removedOn > on))
    .toSorted((a, b) => b.installedOn.localeCompare(a.installedOn))[0];

/**
 * What the record of a unit knows on a day, under the names that checks ask for. What it doesn't know is left out,
 * never guessed: an absent earlier fit is "none" only where the record reaches back far enough to have seen one.
 *
 * @param on YYYY-MM-DD; whatever came later doesn't count
 */
export function recordFactsOf({ unit, fits, model, readings }: UnitRecord, on: string): RecordFacts {
  const known = fits.filter((fit) => fit.installedOn <= on).toSorted((a, b) => a.installedOn.localeCompare(b.installedOn));
  const current = currentFitOn(known, on);
  // Built from texts of the database: whether a rulebook still has them is its compiler's to say.
  const facts: { [Name in keyof KnownRecordFacts]: string | number | null | undefined } = {
    vocation: unit.vocation,
    dryerCartridgeAge: dryerCartridgeAge(unit, known, on),
    ...ofEarlierFits(unit, known, current, on),
    ...(current && model && ofModel(model)),
    ...(current && ofFit(current)),
    ...(current && sinceFit(current, readings, on)),
  };
  return Object.fromEntries(Object.entries(facts).filter((entry): entry is [string, string | number] => entry[1] !== null && entry[1] !== undefined));
}

function dryerCartridgeAge({ dryerCartridgeChangedOn }: UnitRecord['unit'], fits: readonly FitRow[], on: string): number | undefined {
  const changes = fits.filter((fit) => fit.dryerCartridge === 'changed').map((fit) => fit.installedOn);
  if (dryerCartridgeChangedOn && dryerCartridgeChangedOn <= on) changes.push(dryerCartridgeChangedOn);
  const last = changes.toSorted().at(-1);
  return last === undefined ? undefined : daysBetween(last, on) * DAY_S;
}

function ofEarlierFits({ builtOn }: UnitRecord['unit'], fits: readonly FitRow[], current: FitRow | undefined, on: string) {
  const twoYearsAgo = yearsBefore(on, 2);
  const first = fits[0]?.installedOn;
  const firstIsFactory = first !== undefined && builtOn !== null && daysBetween(builtOn, first) <= FACTORY_FIT_WITHIN_DAYS;
  const reachesBack = firstIsFactory || (first !== undefined && first <= twoYearsAgo);
  const removed = fits.filter((fit) => fit !== current && fit.removedOn !== null && fit.removedOn > twoYearsAgo && fit.removedOn <= on);
  const previous = current && fits.filter((fit) => fit !== current).at(-1);
  return {
    previousFitsInTwoYears: reachesBack ? removed.length : undefined,
    previousFitCameOut: previous ? previous.whyOut : current && firstIsFactory ? 'no-earlier-fit' : undefined,
  };
}

const ofModel = ({ drainOpening, intakeType, driveGear, cooling, oilFeedPlace }: NonNullable<UnitRecord['model']>) => ({
  drainOpening,
  intakeType,
  driveGear,
  cooling,
  oilFeedPlace,
});

const changed = (text: string | null) => (text === 'changed' ? 'yes' : text === 'kept' ? 'no' : null);

function ofFit(fit: FitRow) {
  return {
    newOrRebuilt: fit.condition,
    sealantAtGasket: fit.sealant,
    dischargeLineChanged: changed(fit.dischargeLine),
    governorChanged: changed(fit.governor),
    feedLineChanged: changed(fit.feedLine),
    intakeHoseChanged: changed(fit.intakeHose),
    dryerCartridgeChanged: changed(fit.dryerCartridge),
    systemCleaned: fit.systemCleaned,
    breakInRun: fit.breakInRun,
    driveGearReused: fit.driveGear === 'kept' ? 'yes' : fit.driveGear === 'changed' ? 'no' : null,
  };
}

function sinceFit(fit: FitRow, readings: readonly ReadingRow[], on: string) {
  const run = (value: number | null, series: Parameters<typeof runSince>[1]) => {
    if (value === null) return undefined;
    const { sum, lastReadOn } = runSince({ readOn: fit.installedOn, value }, series, on);
    return daysBetween(lastReadOn, on) <= READING_HOLDS_DAYS ? sum : undefined;
  };
  return {
    milesSinceFit: run(fit.installedOdometerM, readings.map(({ readOn, odometerM, odometerReplaced }) => ({ readOn, value: odometerM, replaced: odometerReplaced }))),
    engineHoursSinceFit: run(fit.installedEngineS, readings.map(({ readOn, engineS, engineHoursReplaced }) => ({ readOn, value: engineS, replaced: engineHoursReplaced }))),
  };
}
