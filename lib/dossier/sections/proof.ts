import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { facts, heading, table, text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface ProofPart {
  cause: string;
  plan: string;
  startedAt: Date;
  /** What had to be true at the start, and what was said of it. */
  begin: readonly { statement: string; said: string }[];
  readings: readonly { check: string; answer: string; isInOrder: boolean; by: string; at: Date }[];
  endedAt: Date | null;
  outcome: string | null;
  why: string | null;
  proof: string | null;
}

const OUTCOMES: Readonly<Record<string, string>> = { held: 'It held', comeback: 'It came back', lost: 'Nobody could look any more' };
const PROOFS: Readonly<Record<string, string>> = {
  seen: 'Seen: a teardown, an inspection or a measurement showed it',
  isolated: 'Isolated: one thing was changed alone, and it held',
  'held-with-others': 'Held with others: several things were changed together, and it held',
  none: 'Not proved',
};

/** What was read after the repair, and what that proves. @param watches in the order in which they began */
export function proofSection(watches: readonly ProofPart[], { name, timeZone }: Writer): DossierBlock[] {
  if (watches.length === 0) return text('The repair was not watched yet.');
  return watches.flatMap(({ cause, plan, startedAt, begin, readings, endedAt, outcome, why, proof }) => [
    ...heading(`${cause}, watched from ${momentText(startedAt, timeZone)}`),
    ...facts(
      ['Read', plan],
      ['Outcome', outcome ? `${OUTCOMES[outcome] ?? outcome}${endedAt ? `, ${momentText(endedAt, timeZone)}` : ''}${why ? `: “${why}”` : ''}` : 'Still watched'],
      ['Proof', proof && (PROOFS[proof] ?? proof)],
    ),
    ...table(
      [
        { title: 'At the start', share: 70 },
        { title: 'Said', share: 30 },
      ],
      begin.map(({ statement, said }) => ({ cells: [statement, said] })),
    ),
    ...table(
      [
        { title: 'Reading', share: 40 },
        { title: 'Answer', share: 36 },
        { title: 'In order', share: 24 },
      ],
      readings.map(({ check, answer, isInOrder, by, at }) => ({ cells: [check, answer, isInOrder ? 'yes' : 'no'], note: `${momentText(at, timeZone)}, ${name(by)}`, strong: !isInOrder })),
    ),
  ]);
}
