import type { BreakInEventInput } from './break-in';
import type { RecordFindingInput } from './case';

interface Common {
  /** Order of doing; the database counts it. */
  order?: number;
  /** Whose it is: nobody else's session sends it. */
  personId: string;
  organisationId: string;
  caseId: string;
  /** The row's id, which is also the key by which the server knows a repeat. */
  id: string;
  /** Why the server would not take it; null while it only waits. */
  refusal: { message: string; fields: Record<string, string> } | null;
}

/** Something done on this device that the server has not acknowledged yet. */
export type Waiting =
  | (Common & { kind: 'finding'; body: Omit<RecordFindingInput, 'caseId'> & { deviceAt: string; clockOffsetMs: number } })
  | (Common & { kind: 'acknowledgement'; body: { checkId: string; cautions: { id: string; cautionId: string }[]; deviceAt: string; clockOffsetMs: number } })
  | (Common & { kind: 'note'; findingId: string; body: { id: string; text: string } })
  | (Common & { kind: 'break-in'; runId: string; body: Omit<BreakInEventInput, 'caseId' | 'runId'> & { deviceAt: string; clockOffsetMs: number } });
