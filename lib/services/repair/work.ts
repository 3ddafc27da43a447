import { insertStep, selectSteps, updateRepair } from '@/db/queries/repair';
import { PERMITTED } from '@/lib/auth/permissions';
import { repairWork } from '@/lib/case/view/repair-plan';
import { conflict, invalid } from '@/lib/errors';
import { endRepairInput, markStepInput, planRepairInput } from '@/lib/schemas/repair';
import { refuseUnread } from '../case/write-finding';
import { defineWrite } from '../define';
import { lastMarks } from './marks';
import { lockRepairOf, refuseClosed, refuseEnded } from './locked';
import { refuseStranger, tellOfRepair } from './who';

/** Says for when a repair is planned, and who does it. */
export const planRepair = defineWrite({
  name: 'plan.repair',
  doing: 'plan repairs',
  roles: PERMITTED['case.work'],
  input: planRepairInput,
  run: async ({ tx, ctx, input: { caseId, repairId, plannedOn, assignedTo }, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId, repairId };
    const { row, remedy } = await lockRepairOf(tx, of);
    refuseEnded(row);
    await refuseStranger(tx, { ...of, assignedTo });
    await updateRepair(tx, of, { plannedOn, assignedTo });
    if (assignedTo !== row.assignedTo) await tellOfRepair(tx, ctx, { caseId, repairId, assignedTo, remedy: remedy.name });
    audit({ entity: 'repair', entityId: repairId, changed: { caseId, plannedOn, assignedTo } });
    return { id: repairId, caseId };
  },
});

/**
 * Says of a step that it was done, was not, or doesn't apply, with a value where the maker gives one. The cautions of the
 * repair have to be read on the day. The id is the client's: sent twice, it is said once.
 */
export const markStep = defineWrite({
  name: 'mark.repair-step',
  doing: 'work on repairs',
  roles: PERMITTED['case.work'],
  input: markStepInput,
  run: async ({ tx, ctx, input: { id, caseId, repairId, step, mark, value, note }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId, repairId };
    const { head, compiled, row, remedy } = await lockRepairOf(tx, of);
    const said = (await selectSteps(tx, of)).find((one) => one.id === id);
    if (said) {
      if (said.repairId !== repairId || said.step !== step) throw conflict('This id belongs to another step.');
      unchanged();
      return { id, caseId };
    }
    refuseClosed(head);
    refuseEnded(row);
    if (step >= remedy.steps.length) throw invalid({ step: 'This repair has no such step.' });
    await refuseUnread(tx, ctx, { head, compiled, check: repairWork(remedy) });
    const written = await insertStep(tx, { ...of, id, step, mark, value, note, personId: ctx.person.id, at: ctx.now() });
    if (!written) throw conflict('This id belongs to another step.');
    audit({ entity: 'repair', entityId: repairId, changed: { caseId, remedyId: row.remedyId, step: step + 1, mark, value, note } });
    return { id, caseId };
  },
});

/** Finishes a repair: every step was done or doesn't apply. Or drops it, with why. */
export const endRepair = defineWrite({
  name: 'end.repair',
  doing: 'work on repairs',
  roles: PERMITTED['case.work'],
  input: endRepairInput,
  run: async ({ tx, ctx, input: { caseId, repairId, outcome, whyDropped }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId, repairId };
    const { row, remedy } = await lockRepairOf(tx, of);
    if (row.outcome === outcome) {
      unchanged();
      return { id: repairId, caseId };
    }
    refuseEnded(row);
    if (outcome === 'dropped' && !whyDropped) throw invalid({ whyDropped: 'Say why.' });
    if (outcome === 'done') {
      const marks = lastMarks((await selectSteps(tx, of)).filter((one) => one.repairId === repairId));
      const open = remedy.steps.map((_, i) => i).filter((i) => !marks.has(i) || marks.get(i)?.mark === 'not-done');
      if (open.length > 0) throw conflict(`Not finished yet: ${open.length === 1 ? 'step' : 'steps'} ${open.map((i) => i + 1).join(', ')} ${open.length === 1 ? 'is' : 'are'} not done. Do ${open.length === 1 ? 'it' : 'them'}, or say that ${open.length === 1 ? 'it doesn’t' : 'they don’t'} apply.`);
    }
    await updateRepair(tx, of, { outcome, whyDropped: outcome === 'dropped' ? whyDropped : null, endedAt: ctx.now(), endedBy: ctx.person.id });
    audit({ entity: 'repair', entityId: repairId, changed: { caseId, remedyId: row.remedyId, outcome, reason: whyDropped } });
    return { id: repairId, caseId };
  },
});
