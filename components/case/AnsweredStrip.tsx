import type { CaseState, RulebookView } from '@/lib/schemas/case-view';
import { keepFigures } from '@/components/ui/figures';
import { standing } from './answered';
import type { Picked } from './at-hand';

interface Props {
  state: CaseState;
  rulebook: RulebookView;
  onPick: (picked: Picked) => void;
}

/** As many as the widest screen has room for; the style sheet hides what a narrower one hasn't. */
const SHOWN = 4;

/** The last answers, each to be changed by a tap, and the way to all of them. One row, always, so that nothing moves. */
export function AnsweredStrip({ state, rulebook, onPick }: Props) {
  const answers = standing(state);
  return (
    <div className="answered-strip">
      {answers.length === 0 ? (
        <p className="text-[0.9375rem] text-ink-soft">Nothing answered yet. Each answer is saved as you tap it.</p>
      ) : (
        <ul aria-label="Last answers">
          {answers.slice(0, SHOWN).map((finding) => (
            <li key={finding.id}>
              <button type="button" className="chip" onClick={() => onPick({ kind: 'check', checkId: finding.checkId })}>
                <span className="sr-only">Change </span>
                <span className="chip-name">{keepFigures(rulebook.checks[finding.checkId]?.name ?? finding.checkId)}</span>
                <span className="sr-only">: </span>
                <span className="chip-answer">{finding.waits && <span className="label text-[0.6875rem]">waits </span>}{finding.answer}</span>
              </button>
            </li>
          ))}
          <li>
            <a href="#answered" className="chip chip-all">All <span className="figure">{answers.length}</span></a>
          </li>
        </ul>
      )}
    </div>
  );
}
