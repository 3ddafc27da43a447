// @vitest-environment jsdom
import { cleanup, renderHook } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import type { AtHand } from '@/components/case/at-hand';
import { nameOf, useHeld } from '@/components/case/use-held';

afterEach(cleanup);

const check = (checkId: string): AtHand => ({ kind: 'check', checkId, suggestion: null });

function held() {
  const hook = renderHook(
    ({ asked, turn, pending, closed }: { asked: AtHand | null; turn: number; pending: boolean; closed: string[] }) =>
      nameOf(useHeld(asked, { turn: String(turn), pending, isOpen: (one) => !closed.includes(nameOf(one) ?? '') })),
    { initialProps: { asked: check('a') as AtHand | null, turn: 0, pending: false, closed: [] as string[] } },
  );
  return {
    shows: () => hook.result.current,
    given: (props: { asked: AtHand | null; turn?: number; pending?: boolean; closed?: string[] }) => {
      hook.rerender({ turn: 0, pending: false, closed: [], ...props });
      return hook.result.current;
    },
  };
}

test('a ranking that comes in does not swap the question under the hand', () => {
  expect(held().given({ asked: check('b') })).toBe('a');
});

test('an answer on its way leaves the question, and brings the next one once', () => {
  const { given } = held();
  expect(given({ asked: check('b'), turn: 1, pending: true, closed: ['a'] })).toBe('a');
  expect(given({ asked: check('c'), turn: 1, closed: ['a'] })).toBe('c');
  expect(given({ asked: check('d'), turn: 1, closed: ['a'] })).toBe('c');
});

test('a question that somebody else has answered gives way', () => {
  expect(held().given({ asked: check('b'), closed: ['a'] })).toBe('b');
});

test('where enough was known and no longer is, the next question comes', () => {
  const { given } = held();
  expect(given({ asked: null, turn: 1 })).toBeNull();
  expect(given({ asked: check('b'), turn: 1 })).toBe('b');
});
