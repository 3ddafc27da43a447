'use client';

import { keepPreviousData, queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { listen } from '@/lib/offline/bus';
import { askRanker } from '@/lib/offline/ranker';
import { waitingOf, type Kept } from '@/lib/offline/waiting';
import { queryKeys } from '@/lib/query/keys';
import type { CaseReasons, CaseState } from '@/lib/schemas/case-view';

export interface Provisional {
  state: CaseState;
  reasons: CaseReasons;
}

const keyOf = (waiting: readonly Kept[]) => waiting.map(({ id, refusal }) => (refusal ? `${id}!` : id)).join();

/** What the ranker on this device makes of the case; null while it has not got what it takes. */
export const provisionalOptions = (caseId: string, waiting: readonly Kept[]) =>
  queryOptions({
    queryKey: [...queryKeys.caseProvisional(caseId), keyOf(waiting)],
    queryFn: async (): Promise<Provisional | null> => {
      const result = await askRanker({ kind: 'state', caseId });
      if (result.kind === 'failed') throw new Error(result.message);
      return result.kind === 'state' ? { state: result.state, reasons: result.reasons } : null;
    },
    networkMode: 'always',
    staleTime: Infinity,
  });

/** What waits on this device for the case, kept in step with every tab. */
export function useWaiting(caseId: string, personId: string, enabled: boolean): Kept[] {
  const client = useQueryClient();
  useEffect(() => {
    if (!enabled) return;
    return listen((told) => {
      if (told.caseId !== caseId) return;
      if (told.kind === 'waiting-changed') void client.invalidateQueries({ queryKey: queryKeys.caseWaiting(caseId) });
      if (told.kind === 'kit-changed') void client.invalidateQueries({ queryKey: queryKeys.caseProvisional(caseId) });
    });
  }, [caseId, client, enabled]);
  const { data } = useQuery({ queryKey: queryKeys.caseWaiting(caseId), queryFn: () => waitingOf({ caseId, personId }), enabled, networkMode: 'always', retry: false });
  return data ?? NOTHING;
}

const NOTHING: Kept[] = [];

export function useProvisional(caseId: string, waiting: readonly Kept[], enabled: boolean): Provisional | null {
  const { data } = useQuery({ ...provisionalOptions(caseId, waiting), enabled, placeholderData: keepPreviousData });
  return (enabled && data) || null;
}
