import { describe, expect, it } from 'vitest';
import { compileRulebook, type Check, type Finding } from '@/lib/diagnose';
import { isForTheGate, MOST_CHECKS, MOST_MINUTES, nextAtGate } from '@/lib/gate/next';
import { book, cause, choice, finding, rule, somethingElse } from '@/tests/support/rulebook-parts';

/** Two causes; each check named tells so many decibans between them. */
function small(checks: Record<string, [decibans: number, more?: Partial<Check>]>) {
  return compileRulebook(
    book({
      causes: [cause('leak', 0.45), cause('worn', 0.45), somethingElse(0.1)],
      checks: Object.entries(checks).map(([id, [, more]]) => choice(id, { yes: 0.2, no: 0.8 }, more)),
      rules: Object.entries(checks).map(([id, [decibans]]) => rule(`${id} is yes`, { [id]: 'yes' }, { leak: decibans, worn: -decibans })),
      remedies: ['leak', 'worn'].map((id) => ({ id: `cure ${id}`.replace(' ', '-'), station: null, name: id, causes: [id], look: { minutes: 60 }, fix: { minutes: 120 }, parts: [], seenInBay: true, steps: [], cautions: [], basis: 'judgement' as const })),
    }),
  );
}
const next = (compiled: ReturnType<typeof small>, { findings = [], spent = { checks: 0, minutes: 0 }, leaveOut = [] }: { findings?: Finding[]; spent?: { checks: number; minutes: number }; leaveOut?: string[] } = {}) =>
  nextAtGate(compiled, { findings, options: {}, spent, leaveOut, labourRatePerHour: null });

describe('what the gate asks next', () => {
  it('asks nothing that needs an engine running, brakes released, air let out or something opened', () => {
    expect(isForTheGate({ setUp: {} })).toBe(true);
    expect(isForTheGate({ setUp: { engine: 'off', brakes: 'applied' } })).toBe(true);
    for (const setUp of [{ engine: 'idle' }, { engine: 'governed' }, { air: 'empty' }, { air: 'full' }, { heat: 'cold' }, { brakes: 'released' }, { access: ['panels-off'] }, { access: ['line-open'] }] satisfies Check['setUp'][]) expect(isForTheGate({ setUp })).toBe(false);
    const compiled = small({ running: [6, { setUp: { engine: 'idle' } }], look: [3] });
    expect(next(compiled)?.checkId).toBe('look');
  });

  it('takes what tells most, and of two that tell alike the one that takes less than its share no sooner', () => {
    expect(next(small({ little: [2, { minutes: 1 }], much: [6, { minutes: 1 }] }))?.checkId).toBe('much');
    // Both take less than 7 / 5 minutes: haste is worth nothing, bits are.
    expect(next(small({ hasty: [4, { minutes: 0.25 }], better: [5, { minutes: 1.25 }] }))?.checkId).toBe('better');
  });

  it('stays within the minutes that are left', () => {
    const compiled = small({ long: [6, { minutes: 5 }], short: [3, { minutes: 2 }] });
    // Twice the decibans tell some four times the bits, in two and a half times the minutes.
    expect(next(compiled)?.checkId).toBe('long');
    expect(next(compiled, { spent: { checks: 1, minutes: 4 } })).toEqual({ checkId: 'short', minutes: 2 });
    expect(next(compiled, { spent: { checks: 1, minutes: 5.5 } })).toBeNull();
    expect(next(compiled, { spent: { checks: 1, minutes: MOST_MINUTES } })).toBeNull();
  });

  it('ends after five checks, when nothing is open, and when enough is known', () => {
    const compiled = small({ look: [6] });
    expect(next(compiled, { spent: { checks: MOST_CHECKS, minutes: 1 } })).toBeNull();
    expect(next(compiled, { findings: [finding('look', 'yes')] })).toBeNull();
    expect(next(small({ nothing: [0] }))).toBeNull();
  });

  it('leaves out what was on the first screen', () => {
    expect(next(small({ complaint: [6], look: [3] }), { leaveOut: ['complaint'] })?.checkId).toBe('look');
  });
});
