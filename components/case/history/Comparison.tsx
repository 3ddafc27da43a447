import { SightGlass, percent } from '@/components/ui/SightGlass';
import { compareStates } from '@/lib/case/compare-states';
import type { Step } from '@/lib/case/steps';
import type { CaseState, RulebookView } from '@/lib/schemas/case-view';
import { changeText, timeText } from '../words';

interface At {
  step: Step;
  state: CaseState;
}

interface Props {
  before: At;
  after: At;
  rulebook: RulebookView;
  timeZone: string;
}

/** Two moments beside each other: each cause with its level at both, and what was answered between them. */
export function Comparison({ before, after, rulebook, timeZone }: Props) {
  const { causes, rest, answered } = compareStates(before.state, after.state);
  return (
    <div className="grid grid-cols-1 gap-8">
      <div>
        {[before, after].map(({ step }) => (
          <p key={step.at}><strong>{timeText(step.at, timeZone)}</strong>: {step.what}</p>
        ))}
      </div>
      <div role="region" aria-label="The ranking at two moments" tabIndex={0} className="scroll-x relative">
      <table className="ledger">
        <caption className="sr-only">The ranking at two moments</caption>
        <thead>
          <tr>
            <th scope="col" className="label">Cause</th>
            <th scope="col" className="label whitespace-normal!">{timeText(before.step.at, timeZone)}</th>
            <th scope="col" className="label whitespace-normal!">{timeText(after.step.at, timeZone)}</th>
            <th scope="col" className="label">Change</th>
          </tr>
        </thead>
        <tbody>
          {causes.map(({ causeId, before: was, after: is, places }) => {
            const name = rulebook.causes[causeId]?.name ?? causeId;
            return (
              <tr key={causeId}>
                <th scope="row">{name}</th>
                <td><SightGlass label={`${name}, then`} value={was} size="small" /></td>
                <td><SightGlass label={`${name}, afterwards`} value={is} size="small" /></td>
                <td>{changeText(is - was) ?? 'unchanged'}<span className="block text-[0.9375rem] text-ink-soft">{placesText(places)}</span></td>
              </tr>
            );
          })}
          <tr>
            <th scope="row">All others together</th>
            <td className="figure">{percent(rest.before)}</td>
            <td className="figure">{percent(rest.after)}</td>
            <td>{changeText(rest.after - rest.before) ?? 'unchanged'}</td>
          </tr>
        </tbody>
      </table>
      </div>
      <section aria-labelledby="between" className="grid gap-3">
        <h3 id="between">Answered between them</h3>
        {answered.length === 0 ? (
          <p>Nothing.</p>
        ) : (
          <ol className="border-t border-ink">
            {answered.map((finding) => (
              <li key={finding.id} className="border-b border-rule py-2">
                {rulebook.checks[finding.checkId]?.name ?? finding.checkId}: <strong>{finding.answer}</strong>{' '}
                <span className="text-[0.9375rem] text-ink-soft">{finding.person}, {timeText(finding.receivedAt, timeZone)}</span>
              </li>
            ))}
          </ol>
        )}
      </section>
    </div>
  );
}

function placesText(places: number): string {
  if (places === 0) return 'same place';
  const many = Math.abs(places) === 1 ? '1 place' : `${Math.abs(places)} places`;
  return `${many} ${places > 0 ? 'higher' : 'lower'}`;
}
