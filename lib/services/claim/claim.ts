import { insertClaim, lockClaim, updateClaim } from '@/db/queries/claim';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { conflict, invalid, notFound } from '@/lib/errors';
import { fileClaimInput, settleClaimInput } from '@/lib/schemas/claim';
import { lockCaseOf } from '../case/locked';
import { refuseFutureDay } from '../days';
import { defineWrite } from '../define';

/** Keeps that something was claimed for a case. Claims go on after a case is closed. */
export const fileClaim = defineWrite({
  name: 'file.claim',
  doing: 'keep claims',
  roles: PERMITTED['case.work'],
  input: fileClaimInput,
  run: async ({ tx, ctx, input: { id, caseId, ...claimed }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head } = await lockCaseOf(tx, of);
    const known = await lockClaim(tx, { ...of, claimId: id });
    if (known) {
      if (known.caseId !== caseId) throw conflict('This id belongs to another claim.');
      unchanged();
      return { id, caseId };
    }
    refuseFutureDay({ sentOn: claimed.sentOn }, siteDay(ctx.now(), head.timeZone));
    if (!(await insertClaim(tx, { ...of, id, ...claimed, createdBy: ctx.person.id }))) throw conflict('This id belongs to another claim.');
    audit({ entity: 'claim', entityId: id, changed: { caseId, ...claimed } });
    return { id, caseId };
  },
});

/** Says what came of a claim; said again, the last word holds, and the audit keeps the others. */
export const settleClaim = defineWrite({
  name: 'settle.claim',
  doing: 'keep claims',
  roles: PERMITTED['case.work'],
  input: settleClaimInput,
  run: async ({ tx, ctx, input: { caseId, claimId, state, settledOn, settledAmount, why }, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head } = await lockCaseOf(tx, of);
    const row = await lockClaim(tx, { ...of, claimId });
    if (row?.caseId !== caseId) throw notFound('claim');
    refuseFutureDay({ settledOn }, siteDay(ctx.now(), head.timeZone));
    if (settledOn < row.sentOn) throw invalid({ settledOn: 'That is before it was sent.' });
    if (state !== 'paid' && !why) throw invalid({ why: 'Say why they did not pay all of it.' });
    if (state === 'part-paid' && settledAmount === null) throw invalid({ settledAmount: 'Enter what they paid.' });
    // Paid without an amount: what was claimed.
    const paid = state === 'denied' ? null : (settledAmount ?? row.amount);
    const set = { state, settledOn, settledAmount: paid, why: state === 'paid' ? null : why };
    await updateClaim(tx, { ...of, claimId }, { ...set, updatedAt: ctx.now() });
    audit({ entity: 'claim', entityId: claimId, changed: { caseId, ...set } });
    return { id: claimId, caseId };
  },
});
