import type { Quantity } from '../types';

/**
 * What the record of a unit, its compressor model and its current fit may already know. A check names one of these in
 * `fromRecord`; the application fills `RecordFacts` under the same names. Numbers are SI (m, s, count).
 */
interface RecordFactSpec {
  readonly name: string;
  readonly meaning: string;
  readonly from: 'unit' | 'compressor model' | 'fit';
  /** The texts it may hold, or the quantity of its number. */
  readonly holds: readonly string[] | Quantity;
}

const YES_NO = ['yes', 'no'] as const;

export const RECORD_FACTS = [
  // Unit
  {
    name: 'vocation',
    meaning: 'The duty of the unit: how steadily it runs and what else uses its air.',
    from: 'unit',
    holds: ['long-haul', 'regional', 'stop-start', 'air-for-unloading'],
  },
  {
    name: 'dryerCartridgeAge',
    meaning: 'Time since the dryer cartridge was last changed on this unit, with a fit or by itself.',
    from: 'unit',
    holds: 'duration',
  },
  {
    name: 'previousFitsInTwoYears',
    meaning: 'How many compressors came off this unit in the two years before today; the current one does not count.',
    from: 'unit',
    holds: 'count',
  },
  {
    name: 'previousFitCameOut',
    meaning: 'Why the compressor before this one came out.',
    from: 'unit',
    holds: ['failed-seen', 'not-the-cause', 'precaution', 'unknown', 'no-earlier-fit'],
  },
  // Compressor model
  {
    name: 'drainOpening',
    meaning: 'How oil falls back to the engine: an open cavity at the flange, or a small hole that sealant can close.',
    from: 'compressor model',
    holds: ['large-cavity', 'small-hole'],
  },
  {
    name: 'intakeType',
    meaning: 'Whether the compressor breathes through a filter of its own or from the boosted engine intake.',
    from: 'compressor model',
    holds: ['naturally-aspirated', 'boosted'],
  },
  {
    name: 'driveGear',
    meaning: 'What the drive gear is made of.',
    from: 'compressor model',
    holds: ['steel', 'fibre'],
  },
  {
    name: 'cooling',
    meaning: 'What cools the head.',
    from: 'compressor model',
    holds: ['coolant', 'air'],
  },
  {
    name: 'oilFeedPlace',
    meaning: 'Where engine oil enters: a line at the rear or the side, or through the crank and drive without a line.',
    from: 'compressor model',
    holds: ['rear', 'side', 'through-drive'],
  },
  // Fit
  {
    name: 'newOrRebuilt',
    meaning: 'Whether this compressor was new or rebuilt when it was fitted.',
    from: 'fit',
    holds: ['new', 'rebuilt'],
  },
  { name: 'milesSinceFit', meaning: 'Distance run since this compressor was fitted.', from: 'fit', holds: 'distance' },
  { name: 'engineHoursSinceFit', meaning: 'Engine time since this compressor was fitted.', from: 'fit', holds: 'duration' },
  {
    name: 'sealantAtGasket',
    meaning: 'Sealant put on the mounting gasket at this fit.',
    from: 'fit',
    holds: ['none', 'thin-film', 'spray-adhesive', 'heavy-bead', 'unknown'],
  },
  {
    name: 'dischargeLineChanged',
    meaning: 'Whether the discharge line was changed with this compressor; "no" means the old line was kept.',
    from: 'fit',
    holds: YES_NO,
  },
  { name: 'governorChanged', meaning: 'Whether the governor was changed with this compressor.', from: 'fit', holds: YES_NO },
  { name: 'feedLineChanged', meaning: 'Whether the oil feed line was changed with this compressor.', from: 'fit', holds: YES_NO },
  { name: 'intakeHoseChanged', meaning: 'Whether the intake hose was changed with this compressor.', from: 'fit', holds: YES_NO },
  {
    name: 'dryerCartridgeChanged',
    meaning: 'Whether the dryer cartridge was changed with this compressor.',
    from: 'fit',
    holds: YES_NO,
  },
  {
    name: 'systemCleaned',
    meaning: 'Whether old oil was cleaned out of line, dryer and tanks at this fit.',
    from: 'fit',
    holds: YES_NO,
  },
  { name: 'breakInRun', meaning: 'Whether this compressor was run in under steady load.', from: 'fit', holds: YES_NO },
  {
    name: 'driveGearReused',
    meaning: 'Whether the drive gear was taken over from the compressor before.',
    from: 'fit',
    holds: YES_NO,
  },
] as const satisfies readonly RecordFactSpec[];

export type RecordFact = (typeof RECORD_FACTS)[number];
export type RecordFactName = RecordFact['name'];

type Holds<Name extends RecordFactName> = Extract<RecordFact, { name: Name }>['holds'];

/** The value that a named fact holds: one of its texts, or a number in SI. */
export type RecordFactValue<Name extends RecordFactName> =
  Holds<Name> extends readonly (infer Text)[] ? Text : number;

/** `RecordFacts` with the names and texts that the default rulebook knows; what the application fills. */
export type KnownRecordFacts = { [Name in RecordFactName]?: RecordFactValue<Name> };
