import type { Transaction } from '@/db/connect';
import { insertHolds, lockHoldOfCheck, updateHold } from '@/db/queries/unit-hold';
import type { CompiledCheck } from '@/lib/diagnose/compiled';
import { newId } from '@/lib/ids';

interface Answered {
  organisationId: string;
  unitId: string;
  caseId: string;
  /** null: somebody without a sign-in. */
  personId: string | null;
  check: CompiledCheck;
  finding: { id: string; kind: string; says: boolean; late: boolean };
  /** Whether the case now holds the release by this check. */
  holds: boolean;
  at: Date;
}

/**
 * Brings what stands against a unit's release up to date with an answer: it is placed, or has passed and waits for
 * somebody with the right to lift it, or goes with the answer that is taken back.
 */
export async function holdAfterAnswer(tx: Transaction, { organisationId, unitId, caseId, personId, check, finding, holds, at }: Answered): Promise<void> {
  // A measured value can be out of an adopted limit; any other answer holds where the rulebook says so.
  const canHold = check.check.kind === 'measured' || check.check.states.some(({ holdsRelease }) => holdsRelease);
  if (!canHold) return;
  const standing = await lockHoldOfCheck(tx, { organisationId, unitId, checkId: check.id });
  if (holds && !standing) {
    await insertHolds(tx, [{ organisationId, id: newId(at.getTime()), unitId, caseId, checkId: check.id, findingId: finding.id, placedAt: at }]);
  } else if (holds && standing?.passedBy) {
    await updateHold(tx, standing, { passedBy: null, passedAt: null });
  } else if (!holds && standing && finding.says && !finding.late) {
    await updateHold(tx, standing, { passedBy: finding.id, passedAt: at });
  } else if (!holds && standing && finding.kind === 'undo' && standing.caseId === caseId) {
    await updateHold(tx, standing, { endedAt: at, ended: 'taken-back', endedBy: personId });
  }
}
