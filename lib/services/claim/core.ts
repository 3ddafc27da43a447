import { insertCore, lockCore, updateCore } from '@/db/queries/claim';
import { selectFit } from '@/db/queries/fit';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { conflict, invalid, notFound } from '@/lib/errors';
import { sendCoreInput, settleCoreInput } from '@/lib/schemas/claim';
import { lockCaseOf } from '../case/locked';
import { refuseFutureDay } from '../days';
import { defineWrite } from '../define';

/** Keeps that an old compressor went back for its core. */
export const sendCore = defineWrite({
  name: 'send.core-credit',
  doing: 'keep core credits',
  roles: PERMITTED['case.work'],
  input: sendCoreInput,
  run: async ({ tx, ctx, input: { id, caseId, whichFit: fitId, ...about }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head } = await lockCaseOf(tx, of);
    const known = await lockCore(tx, { ...of, coreId: id });
    if (known) {
      if (known.caseId !== caseId) throw conflict('This id belongs to another core.');
      unchanged();
      return { id, caseId };
    }
    const sent = { ...about, fitId };
    refuseFutureDay({ sentOn: sent.sentOn }, siteDay(ctx.now(), head.timeZone));
    const fit = fitId === null ? undefined : await selectFit(tx, { ...of, fitId });
    if (fitId !== null && fit?.unitId !== head.unitId) throw invalid({ whichFit: 'Choose a compressor of this unit.' });
    if (!(await insertCore(tx, { ...of, id, ...sent, createdBy: ctx.person.id }))) throw conflict('This id belongs to another core.');
    audit({ entity: 'core-credit', entityId: id, changed: { caseId, ...sent } });
    return { id, caseId };
  },
});

/** Says what came of a core; said again, the last word holds, and the audit keeps the others. */
export const settleCore = defineWrite({
  name: 'settle.core-credit',
  doing: 'keep core credits',
  roles: PERMITTED['case.work'],
  input: settleCoreInput,
  run: async ({ tx, ctx, input: { caseId, coreId, state, settledOn, creditedAmount, why }, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head } = await lockCaseOf(tx, of);
    const row = await lockCore(tx, { ...of, coreId });
    if (row?.caseId !== caseId) throw notFound('core');
    refuseFutureDay({ settledOn }, siteDay(ctx.now(), head.timeZone));
    if (settledOn < row.sentOn) throw invalid({ settledOn: 'That is before it was sent.' });
    if (state === 'refused' && !why) throw invalid({ why: 'Say why they refused it.' });
    const credited = state === 'refused' ? null : (creditedAmount ?? row.expectedAmount);
    const set = { state, settledOn, creditedAmount: credited, why: state === 'refused' ? why : null };
    await updateCore(tx, { ...of, coreId }, { ...set, updatedAt: ctx.now() });
    audit({ entity: 'core-credit', entityId: coreId, changed: { caseId, ...set } });
    return { id: coreId, caseId };
  },
});
