// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { Foot } from '@/components/bench/Foot';
import { SumFields } from '@/components/bench/SumFields';
import { useKeypad } from '@/components/bench/use-keypad';
import { sumOf } from '@/lib/air-and-oil/sums';
import type { InputText } from '@/lib/bench/read-texts';
import { US_UNITS } from '@/lib/units';

/** jsdom has no pointer to ask about. */
let fingers = true;
beforeEach(() => {
  fingers = true;
  Object.assign(window, { matchMedia: () => ({ get matches() { return fingers; }, addEventListener: () => undefined, removeEventListener: () => undefined }) });
  Element.prototype.scrollIntoView = () => undefined;
});
afterEach(cleanup);

const sum = sumOf('time-loaded') ?? expect.fail('no such sum');

function Readings() {
  const [texts, setTexts] = useState<Record<string, InputText>>({});
  const keypad = useKeypad();
  return (
    <>
      <form onFocus={keypad.onFocus}>
        <SumFields sum={sum} texts={texts} errors={{}} known={{}} writing={{ units: US_UNITS }} inputMode={keypad.inputMode} onText={(id, text) => setTexts((held) => ({ ...held, [id]: text }))} />
      </form>
      <Foot keypad={keypad} decimalMark=","><p>12 %</p></Foot>
      <output>{JSON.stringify(texts)}</output>
    </>
  );
}

const field = (id: string) => document.getElementById(id) as HTMLInputElement;
const tap = (...names: string[]) => names.forEach((name) => fireEvent.click(screen.getByRole('button', { name })));
const held = () => JSON.parse(screen.getByRole('status').textContent ?? '') as unknown;

describe('the keypad of the bench', () => {
  test('comes with the first field that is tapped, and types into the one that has the focus', () => {
    render(<Readings />);
    expect(screen.queryByRole('group', { name: 'Keypad' })).toBeNull();
    fireEvent.focus(field('loaded'));
    tap('9', '0', 'Decimal mark', '5', 'Delete the last character', 'Delete the last character');
    fireEvent.focus(field('unloaded'));
    tap('6', '3');
    fireEvent.focus(field('loaded.error'));
    tap('2');
    expect(held()).toEqual({ loaded: { value: '90', error: '2' }, unloaded: { value: '63' } });
  });

  test('leaves the fields typable, and gives the keyboard back when it is closed', () => {
    render(<Readings />);
    fireEvent.focus(field('loaded'));
    expect(field('loaded').inputMode).toBe('none');
    fireEvent.change(field('loaded'), { target: { value: '1:30' } });
    expect(held()).toEqual({ loaded: { value: '1:30' } });
    tap('Keypad');
    expect(screen.queryByRole('group', { name: 'Keypad' })).toBeNull();
    expect(field('loaded').inputMode).toBe('decimal');
    expect(document.activeElement).toBe(field('loaded'));
    fireEvent.focus(field('unloaded'));
    expect(screen.queryByRole('group', { name: 'Keypad' })).toBeNull();
    tap('Keypad');
    screen.getByRole('group', { name: 'Keypad' });
  });

  test('is not there for a mouse', () => {
    fingers = false;
    render(<Readings />);
    fireEvent.focus(field('loaded'));
    expect(screen.queryByRole('button', { name: 'Keypad' })).toBeNull();
    expect(field('loaded').inputMode).toBe('decimal');
  });
});
