import type { ReactNode } from 'react';
import { Button } from '@/components/ui/Button';
import type { AnswerInput } from '@/lib/schemas/case';

interface Props {
  /** The answers, or the keypad; on the side of the hand. None before a caution was read. */
  children?: ReactNode;
  /** Short enough to stay at a phone's lower edge while the steps are read. */
  short?: boolean;
  onAnswer: (answer: AnswerInput) => void;
  /** Takes the last answer back; absent when there is none. */
  onUndo?: () => void;
}

/** What a thumb works with: the answers on its side, and beside them the ways out that are always there. */
export function Dock({ children, short, onAnswer, onUndo }: Props) {
  return (
    <div className="dock" data-short={short || undefined}>
      {children && <div className="dock-answers">{children}</div>}
      <div className="dock-aside">
        <Button variant="quiet" onClick={() => onAnswer({ kind: 'cannot-tell' })}>Can’t tell</Button>
        <Button variant="quiet" onClick={() => onAnswer({ kind: 'skip' })}>Skip</Button>
        <Undo onUndo={onUndo} />
      </div>
    </div>
  );
}

/** Keeps its place when there is nothing to undo: nothing beside it moves. */
export function Undo({ onUndo }: { onUndo?: () => void }) {
  return (
    <Button variant="quiet" aria-label="Undo the last answer" aria-disabled={!onUndo || undefined} onClick={onUndo}>
      <svg aria-hidden="true" viewBox="0 0 16 16" className="size-4 shrink-0" fill="none" stroke="currentColor" strokeWidth="2"><path d="M6 2 2.5 5.5 6 9M3 5.5H10A3.8 3.8 0 0 1 10 13.2H5" /></svg>
      Undo
    </Button>
  );
}
