// @vitest-environment jsdom
import { cleanup, renderHook } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { usePassedHolds } from '@/components/case/use-passed-holds';
import type { FindingView } from '@/lib/schemas/case-view';

afterEach(cleanup);

const answer = (more: Partial<FindingView> = {}) => ({ checkId: 'leak', current: true, shares: [{ state: 'under-2', share: 1 }], ...more }) as FindingView;
const start = () => renderHook((state: Parameters<typeof usePassedHolds>[0]) => usePassedHolds(state), { initialProps: { releaseHolds: ['leak'], findings: [answer()] } });

test('what holds has not passed; what held and is answered has', () => {
  const hook = start();
  expect(hook.result.current).toEqual([]);
  hook.rerender({ releaseHolds: [], findings: [answer()] });
  expect(hook.result.current).toEqual(['leak']);
  hook.rerender({ releaseHolds: ['leak'], findings: [answer()] });
  expect(hook.result.current).toEqual([]);
});

test('what was taken back holds nothing any more', () => {
  const hook = start();
  hook.rerender({ releaseHolds: [], findings: [answer({ current: false, shares: [] })] });
  expect(hook.result.current).toEqual([]);
});

test('what began to hold on this page counts as well', () => {
  const hook = start();
  hook.rerender({ releaseHolds: ['leak', 'oil'], findings: [] });
  hook.rerender({ releaseHolds: ['leak'], findings: [answer({ checkId: 'oil' })] });
  expect(hook.result.current).toEqual(['oil']);
});
