import { describe, expect, it } from 'vitest';
import { nextMorning } from '@/lib/services/notice/morning';
import { placeOf, sentenceOf, subjectOf, type Told } from '@/lib/services/notice/sentence';

const told: Told = { kind: 'assigned', caseId: 'c', caseNumber: 12, fleetNumber: 'K-104', by: 'Maud Tierney', what: null };

describe('a notice', () => {
  it.each<[Told, string]>([
    [told, 'Maud Tierney gave you case 12, unit K-104.'],
    [{ ...told, by: null }, 'You were given case 12, unit K-104.'],
    [{ ...told, kind: 'repair-assigned', what: 'Clean the line' }, 'Maud Tierney gave you a repair on case 12, unit K-104: Clean the line.'],
    [{ ...told, kind: 'comeback', what: 'case 31' }, 'It came back: the repair of case 12, unit K-104 did not hold (case 31).'],
    [{ ...told, kind: 'watch-due', what: 'oil caught' }, 'A reading is due that shows whether the repair of case 12, unit K-104 holds: oil caught.'],
    [{ ...told, kind: 'mail-bounced', caseId: null, caseNumber: null, what: 'A dossier' }, 'A mail could not be delivered: “A dossier”.'],
  ])('says what happened: %j', (one, sentence) => expect(sentenceOf(one)).toBe(sentence));

  it('leads to the page of what happened', () => {
    expect([placeOf(told), placeOf({ ...told, kind: 'repair-assigned' }), placeOf({ kind: 'mail-bounced', caseId: null })]).toEqual(['/cases/c', '/cases/c/repair', null]);
  });

  it('names nobody in the subject of its mail', () => {
    expect(subjectOf(told)).toBe('A case for you: case 12, unit K-104');
    expect(subjectOf({ kind: 'mail-bounced', caseNumber: null, fleetNumber: null })).toBe('A mail could not be delivered');
  });
});

// Offsets of the zones: IANA time zone database.
it.each([
  ['2026-03-02T05:59:00Z', 'UTC', '2026-03-02T06:00:00.000Z'],
  ['2026-03-02T06:00:00Z', 'UTC', '2026-03-03T06:00:00.000Z'],
  ['2026-03-02T09:00:00Z', 'America/Chicago', '2026-03-02T12:00:00.000Z'],
  // Clocks go forward in between.
  ['2026-03-07T18:00:00Z', 'America/Chicago', '2026-03-08T11:00:00.000Z'],
  ['2026-03-02T09:00:00Z', 'Asia/Kathmandu', '2026-03-03T00:15:00.000Z'],
])('after %s it is six in the morning in %s at %s', (now, zone, morning) => expect(nextMorning(new Date(now), zone).toISOString()).toBe(morning));
