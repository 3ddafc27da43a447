import { useEffect, useState } from 'react';
import type { Sum } from '@/lib/air-and-oil/sums/sum';
import type { InputText, Writing } from '@/lib/bench/read-texts';
import { searchOfTexts } from '@/lib/bench/texts-in-url';

/** How long after the last key the address follows. */
const ADDRESS_AFTER_MS = 300;

interface Options {
  /** A sum, or whatever else has inputs. */
  fields: Pick<Sum, 'inputs'>;
  /** The address's query as the server saw it. */
  search: Readonly<Record<string, string>>;
  writing: Writing;
  /** What stands in the fields at first, for a query. */
  begin: (search: Readonly<Record<string, string>>) => Record<string, InputText>;
}

/** What is typed on a page of the bench, by the id of its input; the address keeps it. */
export function useTexts({ fields, search, writing, begin }: Options): [Readonly<Record<string, InputText>>, (id: string, text: InputText) => void] {
  const [texts, setTexts] = useState<Record<string, InputText>>(() => begin(search));
  const [touched, setTouched] = useState(false);

  useEffect(() => {
    // A page kept on the device was served for another query, or none.
    const here = Object.fromEntries(new URLSearchParams(location.search));
    if (sameSearch(here, search)) return;
    const frame = requestAnimationFrame(() => setTexts(begin(here)));
    return () => cancelAnimationFrame(frame);
  }, [begin, search]);

  useEffect(() => {
    if (!touched) return;
    const timer = setTimeout(() => {
      const query = new URLSearchParams(location.search);
      for (const { id } of fields.inputs) for (const key of [id, `${id}.error`]) query.delete(key);
      for (const [key, text] of Object.entries(searchOfTexts(fields, texts, writing))) query.set(key, text);
      history.replaceState(history.state, '', `${location.pathname}?${query}`);
    }, ADDRESS_AFTER_MS);
    return () => clearTimeout(timer);
  }, [touched, texts, fields, writing]);

  const onText = (id: string, text: InputText) => {
    setTouched(true);
    setTexts((held) => ({ ...held, [id]: text }));
  };
  return [texts, onText];
}

function sameSearch(a: Readonly<Record<string, string>>, b: Readonly<Record<string, string>>): boolean {
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].every((key) => a[key] === b[key]);
}
