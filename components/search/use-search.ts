import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { queryKeys } from '@/lib/query/keys';
import { api, ApiProblem } from '@/lib/query/problem';
import type { SearchResult } from '@/lib/schemas/search-result';
import { OFFLINE } from './words';

/** As long as between two letters that one types without thinking. */
const PAUSE_MS = 150;

/** What is found for what stands in the box, while it is typed; the answer before stays until the next has come. */
export function useSearch(text: string): { result: SearchResult | undefined; isBehind: boolean; problem: string | null; again: () => void } {
  const typed = text.trim();
  const [wanted, setWanted] = useState(typed);
  useEffect(() => {
    const timer = setTimeout(() => setWanted(typed), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [typed]);

  const { data, error, isFetching, refetch } = useQuery({
    queryKey: queryKeys.search(wanted),
    queryFn: () => api<SearchResult>(`/api/v1/search?q=${encodeURIComponent(wanted)}`),
    enabled: wanted !== '',
    placeholderData: (held) => held,
    retry: false,
    // Asked even when the browser takes itself to be without a connection: it is told so by the answer, in words.
    networkMode: 'always',
  });
  const isAsked = typed !== '' && wanted !== '';
  return {
    result: isAsked ? data : undefined,
    isBehind: typed !== '' && (typed !== wanted || isFetching),
    problem: isAsked && error ? sentenceOf(error) : null,
    again: () => void refetch(),
  };
}

function sentenceOf(error: Error): string {
  if (!(error instanceof ApiProblem)) return 'The search failed. Try again.';
  return error.status === 0 ? OFFLINE : (error.fields.q ?? error.message);
}
