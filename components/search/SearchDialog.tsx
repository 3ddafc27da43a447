'use client';

import { useRouter } from 'next/navigation';
import { useId, useLayoutEffect, useRef, useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/Button';
import { LiveRegion } from '@/components/ui/LiveRegion';
import { turnSingleKeys, useSingleKeysAreOff } from '@/components/ui/single-keys';
import { QueryProvider } from '@/lib/query/provider';
import { searchHref } from '@/lib/schemas/search';
import { Results } from './Results';
import type { Letters } from './SearchBox';
import { useOptions } from './use-options';
import { useSearch } from './use-search';
import { foundText, SEARCHED } from './words';

interface Props {
  /** Typed until now: it stands in the box from the start. */
  typed: Letters;
  onClose: () => void;
}

/** The box that searches everything, over the page that one is on. Its height is the same whatever is found. */
export default function SearchDialog(props: Props) {
  return (
    <QueryProvider>
      <Box {...props} />
    </QueryProvider>
  );
}

function Box({ typed, onClose }: Props) {
  const dialog = useRef<HTMLDialogElement>(null);
  const router = useRouter();
  const id = useId();
  const [text, setText] = useState(typed.text);
  const { result, isBehind, problem, again } = useSearch(text);
  const groups = (problem ? undefined : result)?.groups.filter(({ hits }) => hits.length > 0) ?? [];
  const optionId = (name: string) => `${id}-${name}`;
  const options = groups.length > 0 ? [...groups.flatMap(({ hits }) => hits.map((hit) => optionId(`${hit.kind}-${hit.id}`))), optionId('all')] : [];
  const { active, choose, onKeyDown } = useOptions(options);
  // In one turn with the first drawing, so that no letter falls between page and box.
  useLayoutEffect(() => {
    dialog.current?.showModal();
    typed.stop();
  }, [typed]);

  const close = () => dialog.current?.close();
  function open(event: FormEvent): void {
    event.preventDefault();
    if (active !== null) return document.getElementById(active)?.click();
    if (text.trim() === '') return;
    close();
    router.push(searchHref(text.trim()));
  }

  return (
    <dialog
      ref={dialog}
      aria-label="Search"
      onClose={onClose}
      onClick={(event) => event.target === dialog.current && close()}
      className="mx-auto mt-0 h-dvh max-h-none w-full max-w-none overflow-hidden border-ink bg-paper p-0 text-ink backdrop:bg-[#0a1315]/75 sm:mt-[8dvh] sm:h-[min(84dvh,44rem)] sm:w-[min(92vw,44rem)] sm:border-2"
    >
      <div className="flex h-full flex-col">
        <form action="/search" method="get" role="search" onSubmit={open} className="flex items-end gap-3 border-b-2 border-ink p-4">
          <div className="min-w-0 flex-1">
            <label htmlFor={optionId('box')} className="label mb-1 block">{SEARCHED}</label>
            <input
              id={optionId('box')}
              name="q"
              className="control"
              role="combobox"
              aria-autocomplete="list"
              aria-expanded={options.length > 0}
              aria-controls={options.length > 0 ? optionId('list') : undefined}
              aria-activedescendant={active ?? undefined}
              autoComplete="off"
              autoCapitalize="off"
              spellCheck={false}
              enterKeyHint="search"
              maxLength={200}
              value={text}
              onChange={(event) => {
                setText(event.target.value);
                choose(null);
              }}
              onKeyDown={onKeyDown}
            />
          </div>
          <Button variant="quiet" onClick={close}>Close</Button>
        </form>
        <LiveRegion>{!isBehind && (problem ?? (result && foundText(result.groups)))}</LiveRegion>
        <div className="min-h-0 flex-1 overflow-y-auto" aria-busy={isBehind}>
          {problem ? (
            <div className="grid justify-items-start gap-3 p-4">
              <p className="max-w-prose">{problem}</p>
              <Button variant="quiet" onClick={again}>Try again</Button>
            </div>
          ) : groups.length > 0 ? (
            <Results groups={groups} q={text.trim()} listId={optionId('list')} optionId={optionId} active={active} onGo={close} />
          ) : (
            <p className="max-w-prose p-4 text-ink-soft">{result && !isBehind ? 'Nothing is found. Try the beginning of a word, or fewer words.' : 'A fleet number (also one that is nearly right), a case number, or words: the beginning of each is enough.'}</p>
          )}
        </div>
        <Keys />
      </div>
    </dialog>
  );
}

/** What the keys do, where there are some; and the one that works by itself can be turned off. */
function Keys() {
  const off = useSingleKeysAreOff();
  return (
    <div className="flex flex-wrap items-center gap-x-6 border-t border-rule px-4 text-[0.9375rem] text-ink-soft max-sm:hidden">
      <p className="py-2"><kbd>↑</kbd> <kbd>↓</kbd> choose, <kbd>Enter</kbd> opens, <kbd>Esc</kbd> closes</p>
      <label className="flex min-h-touch cursor-pointer items-center gap-3">
        <input type="checkbox" className="size-6" checked={!off} onChange={(event) => turnSingleKeys(!event.target.checked)} />
        <span><kbd>/</kbd> opens this, too</span>
      </label>
    </div>
  );
}
