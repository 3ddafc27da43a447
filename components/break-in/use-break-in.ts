'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect, useMemo, useState } from 'react';
import { keepAndSend } from '@/components/case/data/send-answer';
import { useWaiting } from '@/components/case/data/use-provisional';
import { newId } from '@/lib/ids';
import { listen } from '@/lib/offline/bus';
import { stamp } from '@/lib/offline/clock';
import type { BreakInEventInput, BreakInEventView, BreakInRunView } from '@/lib/schemas/break-in';
import type { CaseView } from '@/lib/schemas/case-view';
import { clockOf } from './clock-of';

interface Of {
  caseId: string;
  reader: CaseView['reader'];
  run: BreakInRunView;
  /** Of the person: what a pressure without a unit is in. */
  unitSymbol: string;
}

/** What is noted, without what is the device's to add. */
export type Noted = Pick<BreakInEventInput, 'kind' | 'reason' | 'pressure'>;

/** An event as it is shown; one that still waits on this device says so. */
export type ShownEvent = BreakInEventView & { waits?: boolean };

/** A break-in run with what was noted on this device and is not on the server yet: nothing that was tapped is lost. */
export function useBreakIn({ caseId, reader, run, unitSymbol }: Of) {
  const client = useQueryClient();
  const router = useRouter();
  const waiting = useWaiting(caseId, reader.personId, true);
  const [problem, setProblem] = useState<string | null>(null);

  // Another tab, or the sender after a while without a connection.
  useEffect(() => listen((told) => told.caseId === caseId && told.kind === 'sent' && router.refresh()), [caseId, router]);

  const events = useMemo((): ShownEvent[] => {
    const known = new Set(run.events.map(({ id }) => id));
    const here = waiting.flatMap((item): ShownEvent[] =>
      item.kind === 'break-in' && item.runId === run.id && item.refusal === null && !known.has(item.id)
        ? [{ id: item.id, kind: item.body.kind, at: new Date(Date.parse(item.body.deviceAt) + item.body.clockOffsetMs).toISOString(), reason: item.body.reason ?? null, pressure: item.body.pressure ? typed(item.body.pressure, unitSymbol) : null, pressurePa: null, by: 'you', waits: item.sentAt === undefined }]
        : [],
    );
    return [...run.events, ...here].sort((a, b) => (a.at < b.at ? -1 : 1));
  }, [run, waiting, unitSymbol]);

  const clock = useMemo(() => clockOf(run, events), [run, events]);

  async function note(noted: Noted): Promise<boolean> {
    setProblem(null);
    const id = newId();
    try {
      await keepAndSend(client, { ...reader, caseId, id, refusal: null, kind: 'break-in', runId: run.id, body: { id, ...noted, ...stamp() } }, `/api/v1/cases/${caseId}/break-ins/${run.id}/events`);
      return true;
    } catch (error) {
      const { message, fields = {} } = error as { message: string; fields?: Record<string, string> };
      setProblem(Object.values(fields)[0] ?? message);
      return false;
    }
  }

  return { events, clock, note, problem };
}

const typed = (text: string, unitSymbol: string) => (/[a-z]/i.test(text) ? text : `${text} ${unitSymbol}`);
