import { describe, expect, it } from 'vitest';
import { cautions } from '@/lib/diagnose/default-rulebook/cautions';

const textOf = (id: string) => cautions.find((caution) => caution.id === id)?.text ?? '';

describe('cautions of the default rulebook', () => {
  /** The hazards that the brief of the trade names, each with the words that make it one; common practice, no source. */
  it.each([
    ['vehicle-rolls', /level ground.*chock.*key.*tag/],
    ['exhaust-fumes', /20 to 30 minutes.*outdoors.*extraction/],
    ['cab-not-propped', /prop or lock/],
    ['pressure-falls-suspension-brakes', /suspension drops and the spring brakes apply/],
    ['stored-air', /every reservoir.*discharge line.*check valve/],
    ['hot-parts', /head.*discharge.*burn/],
    ['scalding-coolant', /under pressure scalds/],
    ['oil-mist-and-noise', /eye and ear/],
    ['compressed-air-on-skin', /Never point compressed air at skin/],
    ['belts-fan-gears', /Belts, fan and gears/],
    ['carbon-fire', /Carbon and oil.*fire/],
    ['safety-valve', /Never gag/],
    ['oil-in-brake-system', /service tanks or valves.*qualified person.*brake function.*wetted rubber/],
  ])('%s is there and says what matters', (id, words) => {
    expect(textOf(id)).toMatch(words);
  });

  it('speak to a person, briefly', () => {
    for (const { id, text } of cautions) {
      expect(text.length, id).toBeLessThan(320);
      expect(text, id).toMatch(/\.$/);
    }
  });

  it('are asked again when the state that makes them worse is entered', () => {
    const worse = (state: string) => cautions.filter(({ worseWhen }) => (worseWhen as string[]).includes(state)).map(({ id }) => id);
    expect(worse('engine-running')).toEqual(expect.arrayContaining(['exhaust-fumes', 'belts-fan-gears', 'hot-parts']));
    expect(worse('brakes-released')).toContain('vehicle-rolls');
    expect(worse('system-opened')).toEqual(expect.arrayContaining(['stored-air', 'pressure-falls-suspension-brakes']));
  });
});
