import { lockHold, updateHold } from '@/db/queries/unit-hold';
import { selectCaseHead } from '@/db/queries/case';
import { findMember } from '@/db/queries/membership';
import { PERMITTED } from '@/lib/auth/permissions';
import { readAnswer } from '@/lib/case/read-answer';
import { releaseHolds } from '@/lib/case/release-holds';
import type { CompiledCheck } from '@/lib/diagnose/compiled';
import { conflict, forbidden, invalid, notFound } from '@/lib/errors';
import type { Limit } from '@/lib/limits';
import { liftHoldInput } from '@/lib/schemas/limit';
import { writingOf } from '../case/writing';
import type { Ctx } from '../context';
import { defineWrite } from '../define';
import { compiledEdition } from '../edition/compiled';
import { limitsOfCase } from '../limit/of-case';

/**
 * Lifts "do not release" by one check: by somebody with the right, on what was measured or seen, which is kept with the
 * right it was done by. What is measured must be within the limit; what is seen must have passed as an answer first.
 */
export const liftHold = defineWrite({
  name: 'lift.unit-hold',
  doing: 'lift “do not release”',
  roles: PERMITTED['case.work'],
  input: liftHoldInput,
  run: async ({ tx, ctx, input: { unitId, holdId, found, note }, audit, unchanged }) => {
    if (!ctx.mayRelease) throw forbidden('lift “do not release”');
    const organisationId = ctx.organisation.id;
    const hold = await lockHold(tx, { organisationId, unitId, holdId });
    if (!hold) throw notFound('hold');
    if (hold.endedAt) {
      unchanged();
      return { id: holdId };
    }
    const of = { organisationId, caseId: hold.caseId };
    const head = await selectCaseHead(tx, of);
    const compiled = head && (await compiledEdition(tx, { organisationId, editionId: head.editionId }));
    const check = compiled?.checks.get(hold.checkId);
    if (!check) throw notFound('check');
    const measured = check.check.kind === 'measured' ? measuredNow(ctx, { check, found, limit: (await limitsOfCase(tx, { ...of, checkId: check.id })).get(check.id) }) : null;
    if (!measured && !hold.passedBy) throw conflict(`Answer “${check.check.name}” in a case of this unit first: it has not passed yet.`);
    const basis = (await findMember(tx, { organisationId, personId: ctx.person.id }))?.releaseBasis ?? null;
    await updateHold(tx, hold, {
      endedAt: ctx.now(),
      ended: 'lifted',
      endedBy: ctx.person.id,
      liftFound: note ? `${found}. ${note}` : found,
      liftValueSi: measured?.valueSi ?? null,
      liftJudgement: measured?.judgement ?? null,
      liftBasis: basis,
    });
    audit({ entity: 'unit', entityId: unitId, changed: { holdId, checkId: hold.checkId, found, note, basis } });
    return { id: holdId };
  },
});

/** A value as it was measured for lifting, by the same reading and limit as an answer in the case. */
function measuredNow(ctx: Ctx, { check, found, limit }: { check: CompiledCheck; found: string; limit: Limit | undefined }) {
  const answer = readFound(check, found, ctx, limit);
  const at = ctx.now();
  const row = { ...answer, id: '', checkId: check.id, stage: { kind: 'release' as const }, correctedAt: at, receivedAt: at };
  if (releaseHolds({ checks: new Map([[check.id, check]]) }, [row]).length > 0) {
    throw invalid({ found: limit ? `${found} is out of the limit your organisation adopted (${limit.source}).` : `${found} still forbids the release.` });
  }
  return answer;
}

function readFound(check: CompiledCheck, found: string, ctx: Ctx, limit: Limit | undefined) {
  try {
    return readAnswer(check, { kind: 'measured', value: found, sureness: 'sure' }, writingOf(ctx), limit);
  } catch (error) {
    // The form's field is called otherwise than that of an answer.
    const message = (error as { fields?: Record<string, string> }).fields?.value;
    throw message ? invalid({ found: message }) : error;
  }
}
