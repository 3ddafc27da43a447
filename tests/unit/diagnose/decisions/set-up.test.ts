import { describe, expect, it } from 'vitest';
import { settings } from '@/lib/diagnose/default-rulebook/settings';
import { AS_PARKED, minutesToGo, stateAfter } from '@/lib/diagnose/set-up';

const { setUpMinutes: minutes } = settings;

describe('set-up', () => {
  it('costs nothing where the check asks for nothing, or stands there already', () => {
    expect(minutesToGo(AS_PARKED, {}, minutes)).toBe(0);
    expect(minutesToGo(AS_PARKED, { engine: 'off', brakes: 'applied', access: [] }, minutes)).toBe(0);
  });

  it('adds up each step that is missing', () => {
    expect(minutesToGo(AS_PARKED, { engine: 'governed', air: 'full', access: ['line-open', 'cab-tilted'] }, minutes)).toBe(
      minutes.engine.governed + minutes.air.full + minutes.access['line-open'] + minutes.access['cab-tilted'],
    );
  });

  it('pays for a state that nobody knows', () => {
    expect(minutesToGo(AS_PARKED, { heat: 'cold' }, minutes)).toBe(minutes.heat.cold);
  });

  it('keeps what the check did not touch, and what has been opened stays open', () => {
    const after = stateAfter(stateAfter(AS_PARKED, { air: 'empty', access: ['line-open'] }), { engine: 'idle', access: ['head-off', 'line-open'] });
    expect(after).toEqual({ engine: 'idle', air: 'empty', brakes: 'applied', access: ['line-open', 'head-off'] });
    expect(minutesToGo(after, { air: 'empty', access: ['line-open'] }, minutes)).toBe(0);
  });

  it('does not change the state that it is given', () => {
    const before = Object.freeze({ access: Object.freeze(['line-open' as const]) });
    stateAfter(before, { engine: 'idle', access: ['head-off'] });
    expect(before).toEqual({ access: ['line-open'] });
  });
});
