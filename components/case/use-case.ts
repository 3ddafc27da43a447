'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { Danger } from '@/lib/diagnose/cautions';
import { newId } from '@/lib/ids';
import { api } from '@/lib/query/problem';
import { queryKeys } from '@/lib/query/keys';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CaseReasons, CaseState, CaseView } from '@/lib/schemas/case-view';

/** A clock off by less than this is as good as ours: the answer's way to us takes as long. */
const CLOCK_TOLERANCE_MS = 5_000;

export interface AnswerGiven {
  checkId: string;
  answer: AnswerInput;
  askedBecause: 'suggested' | 'choice' | 'panel';
}

/** The state of a case as the server last told it; every part of the page that asks shares one copy. */
export function useCaseState(initial: CaseState): CaseState {
  const { data } = useQuery({
    queryKey: [...queryKeys.caseState(initial.caseId), initial.at],
    queryFn: () => api<CaseState>(`/api/v1/cases/${initial.caseId}`),
    initialData: initial,
    enabled: initial.at === null,
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

/** The state of a case, with what can be done to it. */
export function useCase({ state: initial, now }: CaseView) {
  const { caseId } = initial;
  const state = useCaseState(initial);
  const client = useQueryClient();
  const key = [...queryKeys.caseState(caseId), initial.at];
  const path = `/api/v1/cases/${caseId}`;
  const [clockOffsetMs] = useState(() => {
    const offset = Date.parse(now) - Date.now();
    return Math.abs(offset) < CLOCK_TOLERANCE_MS ? 0 : offset;
  });

  const keep = (fresh: CaseState) => client.setQueryData<CaseState>(key, fresh);

  const answer = useMutation({
    mutationFn: ({ checkId, answer, askedBecause }: AnswerGiven) =>
      api<CaseState>(`${path}/findings`, {
        method: 'POST',
        body: { id: newId(), checkId, answer, askedBecause, deviceAt: new Date().toISOString(), clockOffsetMs },
      }),
    onSuccess: keep,
  });

  const acknowledge = useMutation({
    mutationFn: ({ checkId, cautionIds }: { checkId: string; cautionIds: string[] }) =>
      api<{ cautionId: string; dangers: Danger[] }[]>(`${path}/acknowledgements`, {
        method: 'POST',
        body: { checkId, cautions: cautionIds.map((cautionId) => ({ id: newId(), cautionId })) },
      }),
    onSuccess: (read) => client.setQueryData<CaseState>(key, (held) => held && { ...held, acknowledged: [...held.acknowledged, ...read] }),
  });

  const note = useMutation({
    mutationFn: ({ findingId, text }: { findingId: string; text: string }) =>
      api<{ id: string; findingId: string; text: string; person: string; at: string }>(`${path}/findings/${findingId}/notes`, {
        method: 'POST',
        body: { id: newId(), text },
      }),
    onSuccess: ({ findingId, ...written }) =>
      client.setQueryData<CaseState>(key, (held) => held && {
        ...held,
        findings: held.findings.map((finding) => (finding.id === findingId ? { ...finding, notes: [...finding.notes, written] } : finding)),
      }),
  });

  return { state, answer, acknowledge, note };
}

export type CaseHandle = ReturnType<typeof useCase>;
