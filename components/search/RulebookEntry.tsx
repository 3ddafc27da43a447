import Link from 'next/link';
import { minutesText } from '@/components/case/words';
import { Notice } from '@/components/ui/Notice';
import type { RulebookEntry as Entry } from '@/lib/services/search/read-entry';

const KINDS = { remedy: 'Remedy', check: 'Check', cause: 'Cause' } as const;

/** What the rulebook says of something that was found in it. How it is done stands on a case, behind its cautions. */
export function RulebookEntry({ entry: { kind, name, station, text, lists, minutes, cautions }, closeHref }: { entry: Entry; closeHref: string }) {
  return (
    <article id="entry" aria-labelledby="entry-name" className="grid max-w-prose gap-3 border-2 border-ink bg-sheet p-4 sm:p-6">
      <header>
        <p className="label text-ink-soft">{[KINDS[kind], station].filter(Boolean).join(', ')}</p>
        <h2 id="entry-name">{name}</h2>
      </header>
      {text.map((sentence) => <p key={sentence}>{sentence}</p>)}
      {cautions.length > 0 && <Notice kind="caution">{cautions.map((caution) => <p key={caution}>{caution}</p>)}</Notice>}
      {lists.filter(({ items }) => items.length > 0).map(({ heading, items }) => (
        <div key={heading}>
          <h3>{heading}</h3>
          <ul className="list-disc pl-5">{items.map((item) => <li key={item}>{item}</li>)}</ul>
        </div>
      ))}
      {minutes.length > 0 && (
        <dl className="grid grid-cols-[auto_1fr] gap-x-5">
          {minutes.map(({ what, minutes: time }) => (
            <div key={what} className="contents"><dt>{what}</dt><dd className="figure">{time > 0 ? minutesText(time) : 'no time of its own'}</dd></div>
          ))}
        </dl>
      )}
      {kind !== 'cause' && <p className="text-ink-soft">Its steps stand on a case, once its cautions are read there.</p>}
      <p><Link href={closeHref} className="inline-flex min-h-touch items-center underline underline-offset-4">Back to what is found</Link></p>
    </article>
  );
}
