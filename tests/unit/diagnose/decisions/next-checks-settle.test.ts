import { describe, expect, it } from 'vitest';
import { compileRulebook, createWhatIf, rank, type Finding } from '@/lib/diagnose';
import { openChecks } from '@/lib/diagnose/next-checks-open';
import { whatWouldSettle } from '@/lib/diagnose/next-checks-settle';
import { book, cause, choice, finding, rule, somethingElse } from '../../../support/rulebook-parts';

const compiled = compileRulebook(book({
  causes: [cause('leak', 0.5), cause('worn', 0.4), somethingElse(0.1)],
  checks: [choice('hiss', { yes: 0.2, no: 0.8 }), choice('smoke', { yes: 0.3, no: 0.7 }), choice('wonder', { yes: 0.001, no: 0.999 })],
  rules: [
    rule('hiss', { hiss: 'yes' }, { leak: 3, worn: -6 }),
    rule('smoke', { smoke: 'yes' }, { worn: 4, leak: -8 }),
    rule('wonder', { wonder: 'yes' }, { worn: 16 }),
  ],
}));
const settle = (findings: Finding[], leastChance?: number) =>
  whatWouldSettle(openChecks(createWhatIf(compiled, findings), findings), leastChance);
const pOf = (findings: Finding[], id: string) => rank(compiled, findings).causes.find(({ causeId }) => causeId === id)?.p ?? NaN;

describe('what would settle it', () => {
  it('names for each cause the answer that lifts it and the one that sinks it most', () => {
    const [leak, worn] = settle([]).causes;
    expect(leak).toMatchObject({ causeId: 'leak', up: { checkId: 'hiss', state: 'yes' }, down: { checkId: 'smoke', state: 'yes' } });
    expect(worn).toMatchObject({ causeId: 'worn', up: { checkId: 'smoke', state: 'yes' } });
  });

  it('says what the ranking would then show', () => {
    const [leak] = settle([]).causes;
    expect(leak?.up?.then).toBeCloseTo(pOf([finding('hiss', 'yes')], 'leak'), 12);
    expect(leak?.down?.then).toBeCloseTo(pOf([finding('smoke', 'yes')], 'leak'), 12);
    expect(leak?.down?.leaderThen).toBe('worn');
  });

  it('is the answer that moves the leader most, either way', () => {
    expect(settle([]).mostTelling).toMatchObject({ checkId: 'smoke', state: 'yes' });
  });

  it('passes over wonders', () => {
    expect(settle([]).causes[1]?.up?.checkId).toBe('smoke');
    expect(settle([], 0).causes[1]?.up?.checkId).toBe('wonder');
  });

  it('is nothing once everything is answered', () => {
    const all = [finding('hiss', 'yes'), finding('smoke', 'no'), finding('wonder', 'no')];
    expect(settle(all).mostTelling).toBeUndefined();
    expect(settle(all).causes[0]).toEqual({ causeId: 'leak', p: pOf(all, 'leak') });
  });
});
