import { describe, expect, it } from 'vitest';
import { natsOf } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import type { EvidenceTerm, Finding } from '@/lib/diagnose/types';
import { addDays, daysOf, dueReadings, endOf, isSeen, OUTCOMES, planFor, proofOf, whyNotHeld, type Read, type Watched } from '@/lib/watch';
import { seededRandom } from '@/tests/support/random';

const MILE = 1609.344;
const DAY = 86_400;
const plan = {
  readings: [
    { check: 'oil', inOrder: ['film'], every: 7 * DAY, everyDistance: 2000 * MILE },
    { check: 'heat', inOrder: ['normal'], every: 14 * DAY },
  ],
  duration: 28 * DAY,
  distance: 3000 * MILE,
};
const watched: Watched = { plan, startedOn: '2026-02-20', startOdometerM: 100_000 * MILE };
const read = (checkId: string, onDay: string, more: Partial<Read> = {}): Read => ({ checkId, onDay, inOrder: true, odometerM: null, ...more });
const words = { nameOf: (id: string) => id, distanceText: (m: number) => `${Math.round(m / MILE)} mi` };

describe('the plan', () => {
  it('is that of the cause, else the one for all others', () => {
    expect(planFor(defaultRulebook.proof, 'governor-faulty')?.id).toBe('regulation');
    expect(planFor(defaultRulebook.proof, 'rings-worn')?.id).toBe('oil');
    expect(planFor(undefined, 'rings-worn')).toBeUndefined();
  });

  it('names a plan for every cause of the rulebook', () => {
    for (const { id } of defaultRulebook.causes) expect(planFor(defaultRulebook.proof, id)?.readings.length).toBeGreaterThan(0);
  });
});

describe('what is due', () => {
  it('counts days from the beginning, and from each reading', () => {
    expect(dueReadings(watched, [], { today: '2026-02-26' })).toMatchObject([{ checkId: 'oil', last: null, dueOn: '2026-02-27', state: 'waits' }, { checkId: 'heat', dueOn: '2026-03-06', state: 'waits' }]);
    expect(dueReadings(watched, [], { today: '2026-02-27' })[0]).toMatchObject({ state: 'due' });
    expect(dueReadings(watched, [], { today: '2026-02-28' })[0]).toMatchObject({ state: 'overdue' });
    expect(dueReadings(watched, [read('oil', '2026-02-25')], { today: '2026-02-28' })[0]).toMatchObject({ dueOn: '2026-03-04', state: 'waits' });
  });

  it('comes earlier with the distance, wherever that was read', () => {
    const readings = [read('heat', '2026-02-22', { odometerM: 102_000 * MILE })];
    expect(dueReadings(watched, readings, { today: '2026-02-22' })[0]).toMatchObject({ state: 'due', dueAtM: 102_000 * MILE });
    expect(dueReadings({ ...watched, startOdometerM: null }, readings, { today: '2026-02-22' })[0]).toMatchObject({ state: 'waits', dueAtM: null });
  });

  it('is never due on the day on which it was read, and never before its days or its distance are over', () => {
    const random = seededRandom(7);
    for (let i = 0; i < 500; i += 1) {
      const onDay = addDays('2026-02-20', random.below(40));
      const today = addDays(onDay, random.below(20));
      const [due] = dueReadings(watched, [read('oil', onDay, { odometerM: 100_500 * MILE })], { today });
      expect(due?.dueOn).toBe(addDays(onDay, 7));
      expect(due?.state).toBe(today < addDays(onDay, 7) ? 'waits' : today === due?.dueOn ? 'due' : 'overdue');
    }
  });

  it('counts whole days, across a change of the clock and a month', () => {
    expect(daysOf(7 * DAY)).toBe(7);
    expect(addDays('2026-02-27', 2)).toBe('2026-03-01');
    expect(addDays('2026-03-28', 2)).toBe('2026-03-30');
  });
});

describe('whether it may be said that it held', () => {
  const late = [read('oil', '2026-03-18', { odometerM: 103_100 * MILE }), read('heat', '2026-03-10')];

  it('ends with the day and the distance', () => {
    expect(endOf(watched)).toEqual({ on: '2026-03-20', atM: 103_000 * MILE });
    expect(whyNotHeld(watched, late, { today: '2026-03-20' }, words)).toEqual([]);
    expect(whyNotHeld(watched, late, { today: '2026-03-19' }, words)).toEqual(['It is watched until 20 Mar 2026.']);
  });

  it('says what is missing', () => {
    expect(whyNotHeld(watched, [], { today: '2026-03-20' }, words)).toEqual(['3000 mi are still to be driven.', 'oil was not read.', 'heat was not read.']);
    expect(whyNotHeld(watched, [read('oil', '2026-03-12', { odometerM: 104_000 * MILE }), late[1] ?? read('heat', '')], { today: '2026-03-20' }, words)).toEqual(['oil was read last on 12 Mar 2026, too long before the end.']);
    expect(whyNotHeld(watched, [...late, read('heat', '2026-03-19', { inOrder: false })], { today: '2026-03-20' }, words)).toEqual(['heat was not in order on 19 Mar 2026.']);
  });

  it('lets a later reading in order stand over one that was not', () => {
    expect(whyNotHeld(watched, [read('heat', '2026-03-08', { inOrder: false }), ...late], { today: '2026-03-25' }, words)).toEqual([]);
  });

  it('leaves the distance out where nobody read it at the beginning', () => {
    expect(whyNotHeld({ ...watched, startOdometerM: null }, late, { today: '2026-03-20' }, words)).toEqual([]);
  });
});

describe('what it proves', () => {
  it('stays seen, whatever came of it', () => {
    for (const outcome of OUTCOMES) expect(proofOf({ seen: true, outcome, remediesDone: 3 })).toBe('seen');
  });

  it('is less when more than one thing was changed, and nothing when nothing was', () => {
    expect([0, 1, 2, 5].map((remediesDone) => proofOf({ seen: false, outcome: 'held', remediesDone }))).toEqual(['none', 'isolated', 'held-with-others', 'held-with-others']);
    for (const outcome of ['comeback', 'lost'] as const) expect(proofOf({ seen: false, outcome, remediesDone: 1 })).toBe('none');
  });

  it('counts a cause as seen by one sure answer that speaks for it strongly', () => {
    const term = (decibans: number, more: Partial<EvidenceTerm> = {}): EvidenceTerm => ({ kind: 'table', findingIds: ['f'], checkIds: ['c'], rules: ['rule'], group: 'check:c', weightNats: natsOf(decibans), countedNats: natsOf(decibans), ...more });
    const finding = (more: Partial<Finding> = {}): Finding => ({ id: 'f', checkId: 'c', stage: { kind: 'diagnosis' }, shares: [{ state: 'yes', share: 1 }], reliability: 1, ...more });
    expect(isSeen([term(3), term(10)], [finding()])).toBe(true);
    expect(isSeen([term(9.9), term(-30)], [finding()])).toBe(false);
    expect(isSeen([term(25)], [finding({ reliability: 0.7 })])).toBe(false);
    expect(isSeen([term(25)], [finding({ shares: [{ state: 'yes', share: 0.9 }, { state: 'no', share: 0.1 }] })])).toBe(false);
    expect(isSeen([term(25, { kind: 'compound' })], [finding()])).toBe(false);
    expect(isSeen([term(25, { rules: [] })], [finding()])).toBe(false);
  });
});
