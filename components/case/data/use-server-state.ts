'use client';

import { useQuery } from '@tanstack/react-query';
import { queryKeys } from '@/lib/query/keys';
import { api } from '@/lib/query/problem';
import type { CaseReasons, CaseState } from '@/lib/schemas/case-view';

/** How often one asks where no stream of events comes through. */
const ASK_EVERY_MS = 2_000;

/** The state of a case as the server last told it; every part of the page that asks shares one copy. */
export function useCaseState(initial: CaseState, { mustAsk = false }: { mustAsk?: boolean } = {}): CaseState {
  const { data } = useQuery({
    queryKey: [...queryKeys.caseState(initial.caseId), initial.at],
    queryFn: () => api<CaseState>(`/api/v1/cases/${initial.caseId}`),
    initialData: initial,
    enabled: initial.at === null,
    // Whether there is a connection is found out by asking: a browser that says there is none is not always right.
    networkMode: 'always',
    refetchInterval: mustAsk ? ASK_EVERY_MS : false,
    // The server's older copy must never replace what an answer has just brought.
    structuralSharing: (held, fresh) => ((held as CaseState | undefined)?.version ?? 0) > (fresh as CaseState).version ? held : fresh,
  });
  return data;
}

/** Why the causes stand where they stand; the older reasons stay until those of the newest answer are here. */
export function useCaseReasons({ caseId, at, version }: CaseState, initial: CaseReasons): CaseReasons {
  const { data } = useQuery({
    queryKey: [...queryKeys.caseReasons(caseId, version), at],
    queryFn: () => api<CaseReasons>(`/api/v1/cases/${caseId}/reasons`),
    initialData: version === initial.version ? initial : undefined,
    enabled: at === null && version !== initial.version,
    placeholderData: (held) => held ?? initial,
  });
  return data ?? initial;
}
