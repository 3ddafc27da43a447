import { describe, expect, it } from 'vitest';
import { INSTALL_GROUPS, INSTALL_POINTS, missingWith, pointsFor, practiceOf } from '@/lib/fitting';
import { termOptions } from '@/lib/schemas/terms';

const UNKNOWN = { driveGear: null, cooling: null };

describe('the points of the install record', () => {
  it('have ids, answers and groups of their own', () => {
    expect(new Set(INSTALL_POINTS.map(({ id }) => id)).size).toBe(INSTALL_POINTS.length);
    for (const { answers, group } of INSTALL_POINTS) {
      expect(new Set(answers.map(({ id }) => id)).size).toBe(answers.length);
      expect(Object.keys(INSTALL_GROUPS)).toContain(group);
      expect(answers.some(({ against }) => !against)).toBe(true);
    }
  });

  it('ask why wherever an answer is known to shorten its life', () => {
    for (const { id, answers } of INSTALL_POINTS) for (const answer of answers) if (answer.against) expect([id, answer.asks]).toEqual([id, 'note']);
  });

  it('keep only what the record of a fit knows', () => {
    for (const { answers } of INSTALL_POINTS) {
      for (const { practice } of answers) {
        if (!practice) continue;
        const term = practice.field === 'sealant' ? 'sealant' : practice.field === 'systemCleaned' ? 'yesNo' : 'withIt';
        expect(termOptions(term).map(({ value }) => value)).toContain(practice.value);
      }
    }
  });

  it('follow the model: a fibre gear is never offered as sound, and air needs no coolant', () => {
    const gears = (driveGear: string | null) => pointsFor({ ...UNKNOWN, driveGear }).find(({ id }) => id === 'drive-gear')?.answers.map(({ id }) => id);
    expect(gears('steel')).toEqual(['new', 'steel-reused']);
    expect(gears('fibre')).toEqual(['new', 'fibre-reused']);
    expect(gears(null)).toEqual(['new', 'steel-reused', 'fibre-reused']);
    expect(pointsFor({ ...UNKNOWN, cooling: 'air' }).some(({ id }) => id === 'coolant-bled')).toBe(false);
    expect(pointsFor({ ...UNKNOWN, cooling: 'coolant' }).find(({ id }) => id === 'coolant-bled')?.answers.map(({ id }) => id)).toEqual(['yes', 'no']);
  });
});

it('makes the practice record of the last answer to each point', () => {
  const said = [{ pointId: 'sealant', answer: 'heavy-bead' }, { pointId: 'governor', answer: 'changed' }, { pointId: 'sealant', answer: 'thin-film' }, { pointId: 'pre-filled', answer: 'yes' }];
  expect(practiceOf(said)).toEqual({ sealant: 'thin-film', governor: 'changed' });
});

it('asks for a value where a part stays, and why', () => {
  const kept = INSTALL_POINTS.find(({ id }) => id === 'discharge-line')?.answers.find(({ id }) => id === 'kept');
  if (!kept) throw new Error('no such answer');
  expect(missingWith(kept, { value: null, note: 'new last year' })).toMatchObject({ field: 'value' });
  expect(missingWith(kept, { value: '15 mm', note: null })).toMatchObject({ field: 'note' });
  expect(missingWith(kept, { value: '15 mm', note: 'new last year' })).toBeNull();
});
