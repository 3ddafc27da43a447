'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState, useSyncExternalStore } from 'react';
import { newId } from '@/lib/ids';
import { listen } from '@/lib/offline/bus';
import { stamp } from '@/lib/offline/clock';
import { connectionAtFirst, onConnection, readConnection } from '@/lib/offline/connection';
import { warmRanker } from '@/lib/offline/ranker';
import { refreshKit } from '@/lib/offline/refresh-kit';
import { waitingOf, type Kept } from '@/lib/offline/waiting';
import { queryKeys } from '@/lib/query/keys';
import type { AnswerInput } from '@/lib/schemas/case';
import type { CaseReasons, CaseState, CaseView } from '@/lib/schemas/case-view';
import { withWaiting } from './data/overlay';
import { keepAndSend, PATIENCE_MS, refuseUnreadable } from './data/send-answer';
import { useCaseEvents } from './data/use-case-events';
import { useProvisional, useWaiting, type Provisional } from './data/use-provisional';
import { useReadHere, withRead } from './data/use-read-here';
import { useCaseReasons, useCaseState } from './data/use-server-state';
import { differenceOf, type Difference } from './data/difference';

export { useCaseState } from './data/use-server-state';

export interface AnswerGiven {
  checkId: string;
  answer: AnswerInput;
  askedBecause: 'suggested' | 'choice' | 'panel';
}

/** How page and server stand to each other. */
export interface Sync {
  reachable: boolean;
  signedOut: boolean;
  /** Done here and not yet on the server. */
  unsent: Kept[];
  /** The server would not take them: each says why. */
  refused: Kept[];
  /** The ranking shown is this device's own. */
  provisional: boolean;
  /** The server ranked otherwise than the device had, and how. */
  difference: Difference | null;
}

/** After the last change, before the device fetches what it needs to go on alone. */
const KIT_AFTER_MS = 300;

/** A case as it stands, on the server or on this device, with what can be done to it. */
export function useCase(view: CaseView) {
  const { state: initial, rulebook, reader } = view;
  const { caseId } = initial;
  const isNow = initial.at === null;
  const client = useQueryClient();
  const ask = useCallback(() => void client.invalidateQueries({ queryKey: queryKeys.caseState(caseId) }), [client, caseId]);
  const mustAsk = useCaseEvents(caseId, isNow, ask);
  const server = useCaseState(initial, { mustAsk });
  const serverReasons = useCaseReasons(server, view.reasons);

  const connection = useSyncExternalStore(onConnection, readConnection, connectionAtFirst);
  const waiting = useWaiting(caseId, reader.personId, isNow);
  const unsent = waiting.filter(({ sentAt, refusal }) => sentAt === undefined && refusal === null);
  const slow = useAfter(PATIENCE_MS, unsent.length > 0);
  const provisional = useProvisional(caseId, waiting, isNow && (!connection.reachable || slow));
  const difference = useDifference(caseId, reader.personId, provisional, server);
  useKit(caseId, server.version, isNow && connection.reachable);

  const post = (waitingItem: Parameters<typeof keepAndSend>[1], path: string) => keepAndSend(client, waitingItem, `/api/v1/cases/${caseId}/${path}`);
  const common = { ...reader, caseId, refusal: null };

  const answer = useMutation({
    networkMode: 'always',
    mutationFn: async ({ checkId, answer, askedBecause }: AnswerGiven) => {
      await refuseUnreadable(caseId, checkId, answer);
      const id = newId();
      await post({ ...common, kind: 'finding', id, body: { id, checkId, answer, askedBecause, ...stamp() } }, 'findings');
    },
  });

  const readHere = useReadHere(server.acknowledged);
  const acknowledge = useMutation({
    networkMode: 'always',
    onMutate: ({ checkId, cautionIds }) => readHere.note(cautionIds, rulebook.checks[checkId]),
    onError: (_, { cautionIds }) => readHere.forget(cautionIds),
    mutationFn: ({ checkId, cautionIds }: { checkId: string; cautionIds: string[] }) =>
      post(
        { ...common, kind: 'acknowledgement', id: newId(), body: { checkId, cautions: cautionIds.map((cautionId) => ({ id: newId(), cautionId })), ...stamp() } },
        'acknowledgements',
      ),
  });

  const note = useMutation({
    networkMode: 'always',
    mutationFn: ({ findingId, text }: { findingId: string; text: string }) => {
      const id = newId();
      return post({ ...common, kind: 'note', id, findingId, body: { id, text } }, `findings/${findingId}/notes`);
    },
  });

  const state = withRead(withWaiting(provisional?.state ?? server, waiting, rulebook), readHere.read);
  const reasons: CaseReasons = provisional?.reasons ?? serverReasons;
  const sync: Sync = {
    ...connection,
    unsent,
    refused: waiting.filter(({ refusal }) => refusal !== null),
    provisional: provisional !== null && unsent.some(({ kind }) => kind === 'finding'),
    difference,
  };
  return { state, reasons, sync, answer, acknowledge, note };
}

export type CaseHandle = ReturnType<typeof useCase>;

/** true once `since` has been true for this long. */
function useAfter(ms: number, since: boolean): boolean {
  const [late, setLate] = useState(false);
  useEffect(() => {
    if (!since) return;
    const timer = setTimeout(() => setLate(true), ms);
    return () => {
      clearTimeout(timer);
      setLate(false);
    };
  }, [ms, since]);
  return since && late;
}

/** Keeps on the device what it takes to go on alone, soon after each change. */
function useKit(caseId: string, version: number, enabled: boolean): void {
  useEffect(() => {
    if (!enabled) return;
    const timer = setTimeout(() => {
      warmRanker();
      void refreshKit(caseId).catch(() => undefined);
    }, KIT_AFTER_MS);
    return () => clearTimeout(timer);
  }, [caseId, version, enabled]);
}

/** Takes the server's word on what was sent, and notes where it differs from what this device had shown. */
function useDifference(caseId: string, personId: string, provisional: Provisional | null, server: CaseState): Difference | null {
  const client = useQueryClient();
  const [difference, setDifference] = useState<Difference | null>(null);
  const shown = useRef<Provisional | null>(null);
  useEffect(() => {
    if (provisional) shown.current = provisional;
  }, [provisional]);
  useEffect(
    () =>
      listen((told) => {
        if (told.kind !== 'sent' || told.caseId !== caseId || !told.state) return;
        const fresh = told.state;
        client.setQueryData<CaseState>([...queryKeys.caseState(caseId), null], (held) => (held && held.version > fresh.version ? held : fresh));
        void waitingOf({ caseId, personId }).then((items) => {
          if (items.some(({ sentAt, refusal }) => sentAt === undefined && refusal === null)) return;
          setDifference(shown.current && differenceOf(shown.current.state, fresh));
          shown.current = null;
        });
      }),
    [caseId, personId, client],
  );
  return difference && server.version >= difference.version ? difference : null;
}
