import { describe, expect, test } from 'vitest';
import type { FitRow } from '@/db/queries/fit';
import type { ReadingRow } from '@/db/queries/unit-reading';
import { RECORD_FACTS } from '@/lib/diagnose/default-rulebook/record-facts';
import { currentFitOn, recordFactsOf } from '@/lib/services/unit/record-facts';

const ON = '2025-06-01';
const DAY_S = 86_400;

const UNIT = { vocation: null, builtOn: null, dryerCartridgeChangedOn: null };

const fit = (filled: Partial<FitRow>): FitRow => ({
  id: 'fit',
  unitId: 'unit',
  modelId: 'model',
  modelName: 'Halden 540',
  condition: 'new',
  installedOn: '2024-01-01',
  installedOdometerM: null,
  installedEngineS: null,
  removedOn: null,
  removedOdometerM: null,
  removedEngineS: null,
  whyOut: null,
  sealant: null,
  dischargeLine: null,
  governor: null,
  feedLine: null,
  intakeHose: null,
  dryerCartridge: null,
  driveGear: null,
  systemCleaned: null,
  breakInRun: null,
  asTyped: {},
  note: null,
  createdAt: new Date(0),
  updatedAt: null,
  ...filled,
});

const reading = (readOn: string, filled: Partial<ReadingRow>): ReadingRow => ({
  id: readOn,
  readOn,
  odometerM: null,
  engineS: null,
  odometerReplaced: false,
  engineHoursReplaced: false,
  asTyped: {},
  source: 'unit',
  note: null,
  by: null,
  ...filled,
});

test('a unit of which nothing is recorded has no facts', () => {
  expect(recordFactsOf({ unit: UNIT, fits: [], readings: [] }, ON)).toEqual({});
});

test('every fact that the record can hold is filled, under the names and with the texts that checks ask for', () => {
  const facts = recordFactsOf(
    {
      unit: { ...UNIT, vocation: 'regional' },
      model: { drainOpening: 'small-hole', intakeType: 'boosted', driveGear: 'fibre', cooling: 'coolant', oilFeedPlace: 'through-drive' },
      fits: [
        fit({ id: 'before', installedOn: '2021-01-01', removedOn: '2024-01-01', whyOut: 'not-the-cause' }),
        fit({
          condition: 'rebuilt',
          installedOdometerM: 1000,
          installedEngineS: 50,
          sealant: 'heavy-bead',
          dischargeLine: 'kept',
          governor: 'changed',
          feedLine: 'kept',
          intakeHose: 'changed',
          dryerCartridge: 'changed',
          driveGear: 'kept',
          systemCleaned: 'no',
          breakInRun: 'yes',
        }),
      ],
      readings: [reading('2025-06-01', { odometerM: 5000, engineS: 90 })],
    },
    ON,
  );
  expect(facts).toEqual({
    vocation: 'regional',
    dryerCartridgeAge: 517 * DAY_S,
    previousFitsInTwoYears: 1,
    previousFitCameOut: 'not-the-cause',
    drainOpening: 'small-hole',
    intakeType: 'boosted',
    driveGear: 'fibre',
    cooling: 'coolant',
    oilFeedPlace: 'through-drive',
    newOrRebuilt: 'rebuilt',
    milesSinceFit: 4000,
    engineHoursSinceFit: 40,
    sealantAtGasket: 'heavy-bead',
    dischargeLineChanged: 'no',
    governorChanged: 'yes',
    feedLineChanged: 'no',
    intakeHoseChanged: 'yes',
    dryerCartridgeChanged: 'yes',
    systemCleaned: 'no',
    breakInRun: 'yes',
    driveGearReused: 'yes',
  });
  expect(Object.keys(facts).toSorted()).toEqual(RECORD_FACTS.map(({ name }) => name).toSorted());
  for (const { name, holds } of RECORD_FACTS) {
    if (typeof holds === 'string') expect(facts[name], name).toBeTypeOf('number');
    else expect(holds, name).toContain(facts[name]);
  }
});

describe('the current fit', () => {
  const old = fit({ id: 'old', installedOn: '2022-01-01', removedOn: '2024-01-01' });
  const now = fit({ id: 'now', installedOn: '2024-01-01' });

  test.each([
    ['before the first', '2021-12-31', undefined],
    ['on the day it went on', '2022-01-01', 'old'],
    ['on the day of the change, the new one', '2024-01-01', 'now'],
    ['later', '2025-01-01', 'now'],
  ])('%s', (_name, on, id) => {
    expect(currentFitOn([old, now], on)?.id).toBe(id);
  });

  test('without one, nothing of a fit or a model is known', () => {
    const model = { drainOpening: 'small-hole', intakeType: null, driveGear: null, cooling: null, oilFeedPlace: null };
    expect(recordFactsOf({ unit: UNIT, fits: [{ ...old, sealant: 'none' }], model, readings: [] }, ON)).toEqual({ previousFitsInTwoYears: 1 });
  });
});

describe('earlier fits', () => {
  test('"none" is said only where the record reaches back far enough to have seen one', () => {
    const recent = [fit({ installedOn: '2024-12-01' })];
    expect(recordFactsOf({ unit: UNIT, fits: recent, readings: [] }, ON)).toEqual({ newOrRebuilt: 'new' });

    const longOn = [fit({ installedOn: '2023-05-01' })];
    expect(recordFactsOf({ unit: UNIT, fits: longOn, readings: [] }, ON)).toMatchObject({ previousFitsInTwoYears: 0 });

    const factory = recordFactsOf({ unit: { ...UNIT, builtOn: '2024-11-20' }, fits: recent, readings: [] }, ON);
    expect(factory).toMatchObject({ previousFitsInTwoYears: 0, previousFitCameOut: 'no-earlier-fit' });
  });

  test('only those count that came off within two years before the day', () => {
    const fits = [
      fit({ id: 'a', installedOn: '2020-01-01', removedOn: '2023-06-01' }),
      fit({ id: 'b', installedOn: '2023-06-01', removedOn: '2023-06-02', whyOut: 'precaution' }),
      fit({ id: 'c', installedOn: '2023-06-02', removedOn: '2025-05-31', whyOut: 'unknown' }),
      fit({ id: 'd', installedOn: '2025-05-31' }),
    ];
    expect(recordFactsOf({ unit: UNIT, fits, readings: [] }, ON)).toMatchObject({ previousFitsInTwoYears: 2, previousFitCameOut: 'unknown' });
    // As it was known on an earlier day: the last one was still on.
    expect(recordFactsOf({ unit: UNIT, fits, readings: [] }, '2025-05-30')).toMatchObject({ previousFitsInTwoYears: 2, previousFitCameOut: 'precaution' });
  });

  test('why the one before came out stays open when nobody wrote it down', () => {
    const fits = [fit({ id: 'a', installedOn: '2020-01-01', removedOn: '2024-01-01' }), fit({ id: 'b' })];
    expect(recordFactsOf({ unit: UNIT, fits, readings: [] }, ON)).not.toHaveProperty('previousFitCameOut');
  });
});

describe('run since the fit', () => {
  const on = [fit({ installedOdometerM: 1000, installedEngineS: 100 })];
  const facts = (readings: ReadingRow[]) => recordFactsOf({ unit: UNIT, fits: on, readings }, ON);

  test('is summed over a replaced odometer, while the hour meter goes on', () => {
    expect(
      facts([
        reading('2025-02-01', { odometerM: 3000, engineS: 300 }),
        reading('2025-02-01', { odometerM: 0, odometerReplaced: true }),
        reading('2025-05-20', { odometerM: 500, engineS: 400 }),
      ]),
    ).toMatchObject({ milesSinceFit: 2500, engineHoursSinceFit: 300 });
  });

  test('is not known from a reading of long ago, which would say that the unit stood still', () => {
    expect(facts([reading('2025-04-01', { odometerM: 3000 })])).not.toHaveProperty('milesSinceFit');
    expect(facts([reading('2025-05-15', { odometerM: 3000 })])).toMatchObject({ milesSinceFit: 2000 });
  });

  test('is not known without a reading at the fit', () => {
    expect(recordFactsOf({ unit: UNIT, fits: [fit({})], readings: [reading(ON, { odometerM: 3000 })] }, ON)).not.toHaveProperty('milesSinceFit');
  });
});

describe('the age of the dryer cartridge', () => {
  const changedWithFit = [fit({ installedOn: '2025-01-01', dryerCartridge: 'changed' })];

  test('counts from the last change, with a fit or by itself', () => {
    const age = (dryerCartridgeChangedOn: string | null) => recordFactsOf({ unit: { ...UNIT, dryerCartridgeChangedOn }, fits: changedWithFit, readings: [] }, ON).dryerCartridgeAge;
    expect(age(null)).toBe(151 * DAY_S);
    expect(age('2024-06-01')).toBe(151 * DAY_S);
    expect(age('2025-05-31')).toBe(DAY_S);
    expect(age('2025-06-02')).toBe(151 * DAY_S);
  });
});
