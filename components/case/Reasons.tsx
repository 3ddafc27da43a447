import { Button } from '@/components/ui/Button';
import { percent } from '@/components/ui/SightGlass';
import type { Direction, ReasonView } from '@/lib/schemas/case-view';
import { decibanText } from './words';

const HEADS: Record<Direction, string> = { for: 'Points to it', against: 'Counts against it' };

interface Props {
  reasons: ReasonView[];
  prior: number;
  decibans: boolean;
  /** The reason that is left out to see how the cause would stand. */
  left: ReasonView | null;
  onLeave: (reason: ReasonView | null) => void;
}

/** What counted for and against a cause, the most telling first, each with what the level would be without it. */
export function Reasons({ reasons, prior, decibans, left, onLeave }: Props) {
  if (reasons.length === 0) {
    return <p className="text-ink-soft">Nothing that was answered tells anything of it. It stands where it stands in all cases: <span className="figure">{percent(prior)}</span>.</p>;
  }
  return (
    <>
      {(['for', 'against'] as const).map((direction) => {
        const told = reasons.filter((reason) => reason.direction === direction);
        return told.length > 0 && (
          <div key={direction}>
            <h3 className="label">{HEADS[direction]}</h3>
            <ul className="grid gap-2 border-t border-rule pt-2">
              {told.map((reason) => <Reason key={reason.findingIds.join()} reason={reason} decibans={decibans} left={left === reason} onLeave={onLeave} />)}
            </ul>
          </div>
        );
      })}
      <p className="text-[0.9375rem] text-ink-soft">Before any answer: <span className="figure">{percent(prior)}</span> of all cases.</p>
    </>
  );
}

function Reason({ reason, decibans, left, onLeave }: { reason: ReasonView; decibans: boolean; left: boolean; onLeave: Props['onLeave'] }) {
  return (
    <li>
      <p>
        <strong>{reason.finding}</strong>: {words(reason)}
        {decibans && <> <span className="figure whitespace-nowrap">({decibanText(reason.decibans)})</span></>}
      </p>
      <p className="text-[0.9375rem]">
        {reason.note} <span className="text-ink-soft">({reason.basis ?? 'worked out from the other answers'}{reason.source ? `: ${reason.source}` : ''})</span>
      </p>
      <Button variant="quiet" className="mt-1 px-3! font-normal!" aria-pressed={left} onClick={() => onLeave(left ? null : reason)}>
        Without this: <span className="figure">{percent(reason.without)}</span>
      </Button>
    </li>
  );
}

/** "points clearly to it", "counts a little against it" */
function words({ direction, strength }: ReasonView): string {
  if (direction === 'against') return `counts ${strength} against it`;
  return strength === 'almost by itself' ? 'settles it almost by itself' : `points ${strength} to it`;
}
