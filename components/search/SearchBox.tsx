'use client';

import Link from 'next/link';
import { useEffect, useRef, useState, type ComponentType, type MouseEvent } from 'react';
import { classes } from '@/components/ui/classes';
import { isTyping, singleKeysAreOff } from '@/components/ui/single-keys';
import { loadDialog } from './load-dialog';

/** Once a page has come to rest, so that the box is there when the connection is gone. */
const LOAD_AFTER_MS = 2_000;

/** Whether a key asks for the search: Ctrl or Cmd with K anywhere, a slash where it is not a letter of what one types. */
function asksForSearch({ key, ctrlKey, metaKey, altKey, shiftKey, target, defaultPrevented }: KeyboardEvent): boolean {
  if (defaultPrevented || altKey) return false;
  if (ctrlKey || metaKey) return !shiftKey && key.toLowerCase() === 'k';
  return key === '/' && !isTyping(target) && !singleKeysAreOff();
}

/** Letters that are typed until the box is there. */
export interface Letters {
  text: () => string;
  /** The box is there, and hears them itself. */
  stop: () => void;
}

interface Opened {
  Dialog: ComponentType<{ typed: Letters; onClose: () => void }> | null;
  typed: Letters;
}

const CLOSED: Opened = { Dialog: null, typed: { text: () => '', stop: () => undefined } };

/** Hears letters that are meant for the box, and keeps them from the keys of the page below. */
function letters(onStop: () => void): Letters {
  let text = '';
  const onKey = (event: KeyboardEvent) => {
    if (event.key.length > 1 || event.ctrlKey || event.metaKey || event.altKey) return;
    event.preventDefault();
    event.stopPropagation();
    text += event.key;
  };
  document.addEventListener('keydown', onKey, { capture: true });
  return {
    text: () => text,
    stop() {
      document.removeEventListener('keydown', onKey, { capture: true });
      onStop();
    },
  };
}

/** The way into the search from every page: a link to its page, which with script opens the box over this one. */
export function SearchBox({ className }: { className?: string }) {
  const [{ Dialog, typed }, setDialog] = useState<Opened>(CLOSED);
  const [isMissing, setMissing] = useState(false);
  const hearing = useRef<Letters | null>(null);

  const open = () => {
    // It is on its way: a second asking must not leave a second listener behind.
    if (hearing.current) return;
    setMissing(false);
    const typed = letters(() => (hearing.current = null));
    hearing.current = typed;
    void loadDialog().then(
      ({ default: Loaded }) => setDialog({ Dialog: Loaded, typed }),
      () => {
        typed.stop();
        setMissing(true);
      },
    );
  };
  useEffect(() => {
    const timer = setTimeout(() => void loadDialog().catch(() => undefined), LOAD_AFTER_MS);
    const onKey = (event: KeyboardEvent) => {
      // Another dialog has the page to itself.
      if (!asksForSearch(event) || document.querySelector('dialog[open]')) return;
      event.preventDefault();
      open();
    };
    document.addEventListener('keydown', onKey);
    return () => {
      clearTimeout(timer);
      document.removeEventListener('keydown', onKey);
    };
  }, []);

  const onClick = (event: MouseEvent) => {
    if (event.ctrlKey || event.metaKey || event.shiftKey) return;
    event.preventDefault();
    open();
  };
  return (
    <>
      <Link
        href="/search"
        prefetch={false}
        onClick={onClick}
        aria-haspopup="dialog"
        aria-keyshortcuts="/ Control+K Meta+K"
        title="Search: / or Ctrl K"
        className={classes('label flex min-h-touch min-w-touch items-center justify-center gap-2 rounded border border-transparent px-3 hover:bg-sunk print:hidden', className)}
      >
        <Lens />
        <span className="max-sm:sr-only">Search</span>
      </Link>
      {isMissing && <p role="alert" className="absolute top-full right-4 z-10 max-w-prose border border-ink bg-sheet p-4">The search could not be fetched. Try again when there is a connection.</p>}
      {Dialog && <Dialog typed={typed} onClose={() => setDialog(CLOSED)} />}
    </>
  );
}

function Lens() {
  return (
    <svg aria-hidden="true" viewBox="0 0 20 20" className="size-5" fill="none" stroke="currentColor" strokeWidth="2.25">
      <circle cx="8.5" cy="8.5" r="5.5" />
      <path d="m12.75 12.75 5.25 5.25" />
    </svg>
  );
}
