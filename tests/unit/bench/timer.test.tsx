// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { SumTimer } from '@/components/bench/SumTimer';
import { sumOf } from '@/lib/air-and-oil/sums';
import { regulationPressure } from '@/lib/bench/regulation-pressure';
import type { Writing } from '@/lib/bench/read-texts';
import { dropStopwatches, stopwatch } from '@/lib/offline/stopwatches';
import { METRIC_UNITS, US_UNITS } from '@/lib/units';

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
