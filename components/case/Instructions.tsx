import { Disclosure } from '@/components/ui/Disclosure';
import type { CheckView } from '@/lib/schemas/case-view';
import { Minutes } from './Minutes';
import { setUpWords } from './words';

/** What it takes to make a check: time, set-up, tools, steps, and what it destroys. */
export function Instructions({ check, setUpMinutes }: { check: CheckView; setUpMinutes?: number }) {
  const setUp = setUpWords(check.setUp);
  return (
    <div className="grid gap-2">
      <p className="text-ink-soft">{check.why}</p>
      <dl className="flex flex-wrap gap-x-8 gap-y-1">
        <Item term="Takes">
          <Minutes of={check.minutes} />
          {setUpMinutes ? <> and <Minutes of={setUpMinutes} /> to set up</> : null}
        </Item>
        {setUp.length > 0 && <Item term="With">{setUp.join(', ')}</Item>}
        {check.tools.length > 0 && <Item term="Tools">{check.tools.join(', ')}</Item>}
      </dl>
      {check.spoils.length > 0 && (
        <p>
          <strong>This spoils:</strong> {check.spoils.map(({ name }) => name).join(' · ')}
        </p>
      )}
      {check.steps.length > 0 && (
        <Disclosure summary={`How to do it, ${check.steps.length} ${check.steps.length === 1 ? 'step' : 'steps'}`}>
          <ol className="ml-5 grid list-decimal gap-1">
            {check.steps.map((step) => <li key={step}>{step}</li>)}
          </ol>
          <p className="mt-2 text-[0.9375rem] text-ink-soft">
            {check.basis}{check.source ? `: ${check.source}` : ''}. The vehicle maker’s service information comes first.
          </p>
        </Disclosure>
      )}
    </div>
  );
}

function Item({ term, children }: { term: string; children: React.ReactNode }) {
  return (
    <div className="flex gap-2">
      <dt className="label self-center">{term}</dt>
      <dd>{children}</dd>
    </div>
  );
}
