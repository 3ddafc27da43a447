'use client';

import { useEffect } from 'react';
import { Disclosure } from '@/components/ui/Disclosure';
import { isTyping, singleKeysAreOff, turnSingleKeys, useSingleKeysAreOff } from '@/components/ui/single-keys';

const rows = () => [...document.querySelectorAll<HTMLElement>('[data-row]')];

/** Moves the focus to the next row, or to the first when none has it. */
function step(by: 1 | -1): void {
  const all = rows();
  const at = all.findIndex((row) => row === document.activeElement);
  const next = at < 0 ? all[0] : all[Math.min(Math.max(at + by, 0), all.length - 1)];
  next?.focus();
  next?.closest('tr')?.scrollIntoView({ block: 'nearest' });
}

/** What a key does; false leaves it to the browser. */
function act(event: KeyboardEvent, searchId: string): boolean {
  if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return false;
  const inRow = event.target instanceof HTMLElement && event.target.matches('[data-row]');
  if (event.key === 'ArrowDown' && inRow) return step(1), true;
  if (event.key === 'ArrowUp' && inRow) return step(-1), true;
  if (singleKeysAreOff()) return false;
  if (event.key === 'j') return step(1), true;
  if (event.key === 'k') return step(-1), true;
  if (event.key !== 'f') return false;
  const search = document.getElementById(searchId);
  if (search instanceof HTMLInputElement) search.select();
  search?.focus();
  return true;
}

/** The keys of a list of rows, which are links marked `data-row`, and what they are. Never taken from a field. */
export function ListKeys({ searchId }: { searchId: string }) {
  const off = useSingleKeysAreOff();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (act(event, searchId)) event.preventDefault();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [searchId]);

  return (
    <Disclosure summary="Keys" className="max-lg:hidden print:hidden">
      <dl className="grid max-w-prose grid-cols-[auto_1fr] items-baseline gap-x-5 gap-y-1">
        <Key names={['j', '↓']}>next case; the arrow once a case has the focus</Key>
        <Key names={['k', '↑']}>the one before</Key>
        <Key names={['Enter']}>open it</Key>
        <Key names={['f']}>look for a unit or case number in this list</Key>
        <Key names={['/']}>search everything</Key>
      </dl>
      <label className="mt-3 flex min-h-touch cursor-pointer items-center gap-3">
        <input type="checkbox" className="size-6" checked={!off} onChange={(event) => turnSingleKeys(!event.target.checked)} />
        j, k, f and / work on this device
      </label>
    </Disclosure>
  );
}

function Key({ names, children }: { names: readonly string[]; children: string }) {
  return (
    <>
      <dt className="flex gap-2">{names.map((name) => <kbd key={name} className="rounded border border-edge bg-sheet px-2">{name}</kbd>)}</dt>
      <dd>{children}</dd>
    </>
  );
}
