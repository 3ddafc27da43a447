import { useState } from 'react';
import { dangersOf } from '@/lib/diagnose/cautions';
import type { CaseState, CheckView } from '@/lib/schemas/case-view';

type Read = CaseState['acknowledged'][number];

/**
 * The cautions that this person has just read: read at the tap, and until the server's own state says so. What waits on
 * the device does not tell: it goes once it is sent, which may be before that state comes.
 *
 * @param known as the server last told
 */
export function useReadHere(known: readonly Read[]) {
  const [noted, setNoted] = useState<Read[]>([]);
  const read = noted.filter((one) => !known.some((told) => covers(told, one)));
  if (read.length !== noted.length) setNoted(read);
  return {
    read,
    note: (cautionIds: readonly string[], check: CheckView | undefined) =>
      setNoted((held) => [...held, ...cautionIds.map((cautionId) => ({ cautionId, dangers: dangersOf(check?.setUp ?? {}) }))]),
    forget: (cautionIds: readonly string[]) => setNoted((held) => held.filter(({ cautionId }) => !cautionIds.includes(cautionId))),
  };
}

const covers = (told: Read, one: Read) => told.cautionId === one.cautionId && one.dangers.every((danger) => told.dangers.includes(danger));

export const withRead = (state: CaseState, read: readonly Read[]): CaseState => (read.length === 0 ? state : { ...state, acknowledged: [...state.acknowledged, ...read] });
