import type { ReactNode } from 'react';
import { timeText } from '@/components/case/words';
import { Disclosure } from '@/components/ui/Disclosure';
import { Tag } from '@/components/ui/Tag';
import type { ReleaseCheckView } from '@/lib/schemas/release';

const VERDICTS = { 'in-order': 'in order', out: 'out', missing: 'to measure' } as const;

interface Props {
  required: ReleaseCheckView;
  /** The limit that the organisation adopted; null: none. */
  limit: { text: string; source: string } | null;
  timeZone: string;
  /** By which it is measured; null: the reader can't. */
  form: ReactNode;
}

/** A check of the release: how it stands, and how it is measured. */
export function RequiredCheck({ required: { checkId, name, verdict, because, measured }, limit, timeZone, form }: Props) {
  return (
    <section aria-labelledby={`required-${checkId}`} className="grid gap-3 border-t border-ink pt-4">
      <h3 id={`required-${checkId}`} className="flex flex-wrap items-center gap-x-4 gap-y-1 text-xl">{name} <Tag>{VERDICTS[verdict]}</Tag></h3>
      {because && <p>Asked because of: {because}.</p>}
      {limit && <p>Limit your organisation adopted: <strong className="figure">{limit.text}</strong> <span className="text-ink-soft">({limit.source})</span></p>}
      {measured && (
        <p className="border-l-4 border-ink pl-3">
          <strong className="figure">{measured.answer}</strong>{measured.judgement && `, ${measured.judgement}`} <span className="text-[0.9375rem] text-ink-soft">{measured.by}, {timeText(measured.at, timeZone)}{measured.stale && ': before the last work on the vehicle, so it counts no more'}</span>
        </p>
      )}
      {form && (
        <Disclosure summary={<>{measured && !measured.stale ? 'Measure it again' : 'Measure it'}<span className="sr-only">: {name}</span></>} open={verdict === 'missing'}>
          {form}
        </Disclosure>
      )}
    </section>
  );
}
