import { describe, expect, test } from 'vitest';
import { guessColumns, guessDayOrder, guessDecimalMark, guessMapping, lookAt, readDay, readRow, type DayOrder, type ImportKind, type Mapping, type RowSettings } from '@/lib/import';

describe('a day', () => {
  test.each<[string, DayOrder, string | undefined]>([
    ['2024-03-01', 'mdy', '2024-03-01'],
    ['2024/3/1', 'dmy', '2024-03-01'],
    ['20240301', 'dmy', '2024-03-01'],
    ['01.03.2024', 'dmy', '2024-03-01'],
    ['1/3/24', 'dmy', '2024-03-01'],
    ['3/1/2024 12:00:00 AM', 'mdy', '2024-03-01'],
    ['2024-03-01T00:00:00Z', 'mdy', '2024-03-01'],
    ['01-Mar-24', 'mdy', '2024-03-01'],
    ['March 1, 2024', 'dmy', '2024-03-01'],
    // A spreadsheet's serial day: 1 March 2024 is 45352 (from memory; 2024-01-01 is 45292 and January and February have 60 days).
    ['45352', 'mdy', '2024-03-01'],
    ['45352.75', 'mdy', '2024-03-01'],
    ['31/12/99', 'dmy', '1999-12-31'],
    ['31/12/2024', 'mdy', undefined],
    ['29.02.2023', 'dmy', undefined],
    ['2019', 'dmy', undefined],
    ['soon', 'dmy', undefined],
  ])('%s (%s) is %s', (text, order, day) => expect(readDay(text, order)).toBe(day));

  test('shows its order where one part is above twelve', () => {
    expect(guessDayOrder(['03/04/2024', '03/31/2024'], 'dmy')).toBe('mdy');
    expect(guessDayOrder(['31/03/2024'], 'mdy')).toBe('dmy');
    expect(guessDayOrder(['1.2.2024'], 'mdy')).toBe('dmy');
    expect(guessDayOrder(['03/04/2024'], 'mdy')).toBe('mdy');
  });
});

test('the decimal mark shows in figures that leave no doubt', () => {
  expect(guessDecimalMark(['410.000', '12,5'], '.')).toBe(',');
  expect(guessDecimalMark(['410,000', '12.5'], ',')).toBe('.');
  expect(guessDecimalMark(['410,000', '7'], ',')).toBe(',');
});

describe('columns', () => {
  test('are guessed by their heads, with the unit that a head names', () => {
    expect(guessColumns('units', ['Truck no.', 'Odometer (km)', 'Colour', 'Depot', 'Engine hours'])).toEqual([{ field: 'fleetNumber' }, { field: 'odometer', unit: 'km' }, {}, { field: 'siteId' }, { field: 'engineHours', unit: 'h' }]);
    expect(guessColumns('fits', ['UNIT', 'Compressor', 'Install date', 'Odometer when fitted [mi]', 'Removed'])).toEqual([{ field: 'fleetNumber' }, { field: 'model' }, { field: 'installedOn' }, { field: 'installedOdometer', unit: 'mi' }, { field: 'removedOn' }]);
  });

  test('give each field once', () => {
    expect(guessColumns('units', ['Unit', 'Fleet number']).filter(({ field }) => field === 'fleetNumber')).toHaveLength(1);
  });

  test('of a whole file are guessed with its mark, its order of days and its decimals', async () => {
    const bytes = new TextEncoder().encode('Unit;Odometer (km);Read on\nT-1;1234,5;31/12/2024\n');
    const looked = await lookAt(bytes);
    expect(looked.sample).toEqual([['T-1', '1234,5', '31/12/2024']]);
    expect(guessMapping('units', looked, { decimal: '.', dayOrder: 'mdy' })).toEqual({
      encoding: 'utf-8', delimiter: ';', decimal: ',', dayOrder: 'dmy', columns: ['fleetNumber', 'odometer', 'readOn'], units: { odometer: 'km' }, fixed: {},
    });
  });
});

const CHOICES = {
  site: [{ value: 'yard', label: 'Yard' }],
  cause: [{ value: 'rings-worn', label: 'Worn rings' }, { value: 'something-else', label: 'Something else' }, { value: 'drain-choked', label: 'Choked drain' }],
  complaint: [{ value: 'complaint-oil', label: 'Oil in the system' }, { value: 'complaint-slow', label: 'Slow build-up' }],
  proof: [{ value: 'none', label: 'Not yet' }, { value: 'seen', label: 'Seen' }, { value: 'isolated', label: 'Isolated' }],
  sureness: [{ value: 'sure', label: 'Sure' }, { value: 'guess', label: 'A guess' }],
};

function settings(kind: ImportKind, header: string[], mapping: Partial<Mapping> = {}): RowSettings {
  return { kind, header, choices: CHOICES, somethingElse: 'something-else', today: '2026-06-01', mapping: { encoding: 'utf-8', delimiter: ';', decimal: ',', dayOrder: 'dmy', columns: [], units: {}, fixed: {}, ...mapping } };
}

describe('a row', () => {
  const units = settings('units', ['Unit', 'km', 'Kind', 'Read'], { columns: ['fleetNumber', 'odometer', 'vehicleKind', 'readOn'], units: { odometer: 'km' }, fixed: { siteId: 'yard' } });

  test('becomes a record in SI, with what stood in its cells', () => {
    expect(readRow([' T-1 ', '410.000', 'Truck', '1.3.2024'], units)).toEqual({
      ok: true,
      record: { fleetNumber: 'T-1', siteId: 'yard', vehicleKind: 'truck', odometer: { si: 410_000_000, asTyped: '410.000 km' }, readOn: '2024-03-01' },
    });
  });

  test('keeps a unit that the cell names', () => {
    expect(readRow(['T-1', '10 mi', 'bus', ''], units)).toMatchObject({ ok: true, record: { odometer: { si: 16_093.44, asTyped: '10 mi' } } });
  });

  test('tells everything that is wrong with it: where, what, and what would do', () => {
    expect(readRow(['', 'many', 'boat', '31.02.2024'], units)).toEqual({
      ok: false,
      problems: [
        { column: 'Unit', text: '', message: 'Fleet number is missing.', accepts: 'Up to 40 characters.' },
        { column: 'Kind', text: 'boat', message: 'This is none of the list.', accepts: 'Truck; Bus.' },
        { column: 'km', text: 'many', message: expect.stringContaining("'many' is not"), accepts: expect.stringContaining('in km') },
        { column: 'Read', text: '31.02.2024', message: 'This is no day that can be read.', accepts: expect.stringContaining('31.12.2024') },
      ],
    });
  });

  test('from the future, or with a character that was cut, is refused', () => {
    expect(readRow(['T-1', '', 'truck', '2.6.2026'], units)).toMatchObject({ ok: false, problems: [{ message: 'This day is yet to come.' }] });
    expect(readRow(['T-\ufffd', '', 'truck', ''], units)).toMatchObject({ ok: false, problems: [{ column: 'Unit', message: expect.stringContaining('could not be read') }] });
  });

  const fits = settings('fits', ['Unit', 'Model', 'In', 'Out', 'Why', 'Line', 'Odo in', 'Odo out'], {
    columns: ['fleetNumber', 'model', 'installedOn', 'removedOn', 'whyOut', 'dischargeLine', 'installedOdometer', 'removedOdometer'], units: { installedOdometer: 'km', removedOdometer: 'km' }, fixed: { condition: 'new' },
  });

  test('of a fit has its days and readings in order, and says why it came out', () => {
    expect(readRow(['T-1', 'M', '1.1.2024', '1.1.2025', 'unknown', 'replaced', '10', '20'], fits)).toMatchObject({ ok: true, record: { condition: 'new', whyOut: 'unknown', dischargeLine: 'changed' } });
    expect(readRow(['T-1', 'M', '1.1.2024', '1.1.2023', 'unknown', '', '', ''], fits)).toMatchObject({ ok: false, problems: [{ column: '', message: 'It came out before it was fitted.' }] });
    expect(readRow(['T-1', 'M', '1.1.2024', '1.1.2025', '', '', '', ''], fits)).toMatchObject({ ok: false, problems: [{ message: 'It came out, and nothing says why.' }] });
    expect(readRow(['T-1', 'M', '1.1.2024', '', 'unknown', '', '', ''], fits)).toMatchObject({ ok: false, problems: [{ message: expect.stringContaining('not the day') }] });
    expect(readRow(['T-1', 'M', '1.1.2024', '1.1.2025', 'unknown', '', '30', '20'], fits)).toMatchObject({ ok: false, problems: [{ message: 'Its odometer ran backwards.' }] });
  });

  const cases = settings('cases', ['Unit', 'Open', 'Closed', 'Cause', 'More', 'Proof', 'Complaint'], {
    columns: ['fleetNumber', 'openedOn', 'closedOn', 'mainCause', 'contributingCauses', 'proof', 'complaints'], fixed: { sureness: 'sure' },
  });

  test('of a past case is closed, with a cause of the rulebook', () => {
    expect(readRow(['T-1', '1.1.2024', '3.1.2024', 'worn rings', 'Choked drain; ', 'seen', 'oil in the system, slow build-up'], cases)).toMatchObject({
      ok: true, record: { mainCause: 'rings-worn', contributingCauses: ['drain-choked'], proof: 'seen', complaints: ['complaint-oil', 'complaint-slow'], sureness: 'sure' },
    });
    expect(readRow(['T-1', '1.1.2024', '', 'gremlins', '', '', 'Slow build-up'], cases)).toMatchObject({ ok: false, problems: [{ message: 'Closed on is missing.' }, { column: 'Cause', accepts: 'Worn rings; Something else; Choked drain.' }] });
    expect(readRow(['T-1', '1.1.2024', '1.1.2023', 'something else', 'worn rings', 'isolated', 'Slow build-up'], cases)).toMatchObject({
      ok: false, problems: [{ message: 'It was closed before it was opened.' }, { message: expect.stringContaining('nothing says what it was') }, { message: expect.stringContaining('Isolated means') }],
    });
  });
});
