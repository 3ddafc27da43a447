'use client';

import { useQueries, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { api } from '@/lib/query/problem';
import type { CaseReasons, CaseState } from '@/lib/schemas/case-view';

export interface Moment {
  state: CaseState;
  reasons: CaseReasons;
}

/** The past doesn't change: what was fetched once is good for as long as the page is open. */
const momentQuery = (caseId: string, at: string) => ({
  queryKey: ['case', caseId, 'moment', at],
  queryFn: async (): Promise<Moment> => {
    const query = `?at=${encodeURIComponent(at)}`;
    const [state, reasons] = await Promise.all([
      api<CaseState>(`/api/v1/cases/${caseId}${query}`),
      api<CaseReasons>(`/api/v1/cases/${caseId}/reasons${query}`),
    ]);
    return { state, reasons };
  },
  staleTime: Infinity,
});

/** How long somebody rests on a step before its neighbours are fetched too. */
const NEIGHBOURS_AFTER_MS = 250;

/** A case at some instants; those that are near are fetched ahead, so that the next step is there when it is taken. */
export function useMoments(caseId: string, instants: readonly string[], near: readonly string[], known: Readonly<Record<string, Moment>>) {
  const client = useQueryClient();
  const ahead = near.join();
  useEffect(() => {
    const timer = setTimeout(() => {
      for (const at of ahead.split(',').filter(Boolean)) void client.prefetchQuery(momentQuery(caseId, at));
    }, NEIGHBOURS_AFTER_MS);
    return () => clearTimeout(timer);
  }, [client, caseId, ahead]);
  return useQueries({ queries: instants.map((at) => ({ ...momentQuery(caseId, at), initialData: known[at] })) });
}
