import { useId } from 'react';
import type { Hand } from './hand';

const WORDS: Record<Hand, string> = { right: 'Right hand', left: 'Left hand' };

/** Which hand answers: of no use to a mouse on a desk, so it shows where screens are held. */
export function HandSwitch({ hand, onChange }: { hand: Hand; onChange: (hand: Hand) => void }) {
  const name = useId();
  return (
    <fieldset className="no-print min-w-0 lg:pointer-fine:hidden">
      <legend className="sr-only">Hand that answers</legend>
      <div className="flex w-fit rounded border border-edge">
        {(['left', 'right'] as const satisfies readonly Hand[]).map((option) => (
          <label key={option} className="grid min-h-touch cursor-pointer place-items-center border-l border-edge px-4 font-heading font-semibold font-stretch-[80%] first:border-l-0 hover:bg-sunk has-[:checked]:bg-ink has-[:checked]:text-paper has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-ink">
            <input type="radio" className="sr-only" name={name} value={option} checked={hand === option} onChange={() => onChange(option)} />
            {WORDS[option]}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
