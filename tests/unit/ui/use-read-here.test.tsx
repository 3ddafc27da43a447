// @vitest-environment jsdom
import { act, cleanup, renderHook } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { useReadHere } from '@/components/case/data/use-read-here';
import type { CheckView } from '@/lib/schemas/case-view';

afterEach(cleanup);

type Read = Parameters<typeof useReadHere>[0];
const running = { setUp: { engine: 'idle' } } as CheckView;
const start = () => renderHook(({ known }: { known: Read }) => useReadHere(known), { initialProps: { known: [] as Read } });

test('a caution is read at the tap, and stays so while the server does not yet say it', () => {
  const hook = start();
  act(() => hook.result.current.note(['hot-parts'], running));
  hook.rerender({ known: [] });
  hook.rerender({ known: [{ cautionId: 'eyes', dangers: ['engine-running'] }] });
  expect(hook.result.current.read).toEqual([{ cautionId: 'hot-parts', dangers: ['engine-running'] }]);
});

test('what the server has read in less danger does not stand for it', () => {
  const hook = start();
  act(() => hook.result.current.note(['hot-parts'], running));
  hook.rerender({ known: [{ cautionId: 'hot-parts', dangers: [] }] });
  expect(hook.result.current.read).toHaveLength(1);
});

test('once the server says so it is the server’s to tell: when the day is over, it is asked again', () => {
  const hook = start();
  act(() => hook.result.current.note(['hot-parts'], running));
  hook.rerender({ known: [{ cautionId: 'hot-parts', dangers: ['engine-running'] }] });
  hook.rerender({ known: [] });
  expect(hook.result.current.read).toEqual([]);
});

test('what could not be kept is unread', () => {
  const hook = start();
  act(() => hook.result.current.note(['hot-parts', 'eyes'], running));
  act(() => hook.result.current.forget(['hot-parts']));
  expect(hook.result.current.read.map(({ cautionId }) => cautionId)).toEqual(['eyes']);
});
