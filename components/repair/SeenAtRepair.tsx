import type { ReactNode } from 'react';
import { timeText } from '@/components/case/words';
import { Disclosure } from '@/components/ui/Disclosure';
import type { CheckView, FindingView } from '@/lib/schemas/case-view';

interface Props {
  /** The repair's name, because a page has several. */
  about: string;
  checks: readonly CheckView[];
  /** What was seen at this repair. */
  seen: readonly FindingView[];
  timeZone: string;
  /** By which a check is answered. */
  form: (check: CheckView) => ReactNode;
}

/** What is seen when something is opened: it goes back into the ranking, and the order of repairs with it. */
export function SeenAtRepair({ about, checks, seen, timeZone, form }: Props) {
  if (checks.length === 0) return null;
  return (
    <Disclosure summary={<>What you see when it is open<span className="sr-only">: {about}</span></>}>
      <p className="mb-4 max-w-prose">What you see here goes back into the ranking. It never overrules what was found before the repair.</p>
      <ul className="grid">
        {checks.map((check) => {
          const said = seen.find(({ checkId }) => checkId === check.id);
          return (
            <li key={check.id} className="border-t border-rule py-3">
              {said && <p className="border-l-4 border-ink pl-3"><strong>{said.answer}</strong> <span className="text-[0.9375rem] text-ink-soft">{said.person}, {timeText(said.at, timeZone)}</span></p>}
              <Disclosure summary={check.name}>
                <p className="mb-3 text-ink-soft">{check.why}</p>
                {form(check)}
              </Disclosure>
            </li>
          );
        })}
      </ul>
    </Disclosure>
  );
}
