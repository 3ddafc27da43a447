// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { SumTimer } from '@/components/bench/SumTimer';
import { sumOf } from '@/lib/air-and-oil/sums';
import { coolingAdvice, fallByCooling } from '@/lib/bench/cooling-advice';
import { regulationPressure } from '@/lib/bench/regulation-pressure';
import type { Writing } from '@/lib/bench/read-texts';
import { dropStopwatches, stopwatch } from '@/lib/offline/stopwatches';
import { ATMOSPHERE, METRIC_UNITS, toSi, US_UNITS } from '@/lib/units';

const US: Writing = { units: US_UNITS };
const KPA: Writing = { units: METRIC_UNITS };
const BAR: Writing = { units: { ...METRIC_UNITS, pressure: 'bar' }, decimal: ',' };
const sum = sumOf('measured-build-up') ?? expect.fail('no such sum');

afterEach(() => {
  cleanup();
  dropStopwatches();
});

const timer = (writing: Writing) => <SumTimer sum={sum} name="t" writing={writing} onSeconds={() => undefined} />;
const key = (name: RegExp | string) => screen.getByRole('button', { name });

describe('a pressure of a regulation', () => {
  test.each([
    [85, US, '85 psi'],
    [85, KPA, '586 kPa (85 psi)'],
    [100, KPA, '689 kPa (100 psi)'],
    [90, BAR, '6,21 bar (90 psi)'],
  ] as const)('%d psi is said in the person’s unit, with its own figure behind', (psi, writing, text) => {
    expect(regulationPressure(psi, writing)).toBe(text);
  });
});

describe('the stopwatch of a build-up', () => {
  test('says when to press in the person’s unit', () => {
    render(timer(KPA));
    fireEvent.click(key('Start at 586 kPa (85 psi)'));
    key('Stop at 689 kPa (100 psi)');
    key('621 kPa (90 psi)');
    key('655 kPa (95 psi)');
  });

  test('keeps a mark when the unit is changed after it', () => {
    const { rerender } = render(timer(KPA));
    fireEvent.click(key(/^Start/));
    fireEvent.click(key('621 kPa (90 psi)'));
    expect(stopwatch('t').marks.map(({ id }) => id)).toEqual(['90 psi']);
    rerender(timer(BAR));
    expect(key(/^6,21 bar \(90 psi\)/).getAttribute('aria-disabled')).toBe('true');
    expect(key(/^6,55 bar/).getAttribute('aria-disabled')).toBeNull();
  });

  test('shows a mark that was kept before by its words', () => {
    localStorage.setItem('carryover-stopwatch/t', JSON.stringify({ startedAt: 1_000, stoppedAt: 20_000, marks: [{ label: '90 psi', at: 6_300 }] }));
    render(timer(KPA));
    key('621 kPa (90 psi)0:05.3');
  });
});

describe('the advice on cooling beside a leak-down', () => {
  const psi = toSi(1, 'pressure', 'psi');

  test('comes from the ideal gas: (120 + 14.696) psi x 20 / 579.67 °R', () => {
    expect(fallByCooling() / psi).toBeCloseTo((120 + ATMOSPHERE / psi) * (20 / (120 + 459.67)), 9);
    expect(fallByCooling({ pressure: 120 * psi, hot: 300, cooledBy: 0 })).toBeCloseTo(0, 6);
  });

  test('is said in the person’s units, to whole degrees', () => {
    expect(coolingAdvice(US)).toContain('at 120 psi and 120 °F that cools by 20 °F loses 4.6 psi');
    expect(coolingAdvice(KPA)).toContain('at 827 kPa and 49 °C that cools by 11 °C loses 32 kPa');
    expect(coolingAdvice(BAR)).toContain('at 8,27 bar and 49 °C that cools by 11 °C loses 0,32 bar');
  });

  test('stands beside the stopwatch of the leak-down alone', () => {
    render(<SumTimer sum={sumOf('leak-down') ?? expect.fail('no such sum')} name="t" writing={KPA} onSeconds={() => undefined} />);
    expect(screen.getByTestId('timer-advice').textContent).toBe(coolingAdvice(KPA));
    cleanup();
    render(timer(KPA));
    expect(screen.queryByTestId('timer-advice')).toBeNull();
  });
});
