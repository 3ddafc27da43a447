import type { SearchHit } from '@/lib/schemas/search-result';
import { Marked } from './Marked';

/** What was found, in up to three lines: what it is called, what it belongs to, and its words. */
export function Hit({ hit: { title, about, words, nearly } }: { hit: SearchHit }) {
  return (
    <>
      <span className="heading block text-[1.1875rem]">
        <Marked segments={title} />
        {nearly && <span className="ml-2 font-sans text-[0.9375rem] font-normal font-stretch-normal"> nearly what you typed</span>}
      </span>
      <span className="block text-[0.9375rem]">{about}</span>
      {words && <span className="mt-0.5 block max-w-prose"><Marked segments={words} /></span>}
    </>
  );
}
