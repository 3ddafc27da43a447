import type { Transaction } from '@/db/connect';
import { selectFindings } from '@/db/queries/finding';
import { insertRepair, lockRepair, selectRepairs } from '@/db/queries/repair';
import { selectLatestRun } from '@/db/queries/run';
import { PERMITTED } from '@/lib/auth/permissions';
import { findingsForRanking, rankOptions } from '@/lib/case/findings-for-ranking';
import { orderNow } from '@/lib/case/view/repair-plan';
import { rank, type CompiledRulebook } from '@/lib/diagnose';
import { conflict, invalid } from '@/lib/errors';
import { chooseRepairInput } from '@/lib/schemas/repair';
import { lockCaseOf } from '../case/locked';
import { defineWrite } from '../define';
import { refuseClosed } from './locked';
import { refuseStranger, tellOfRepair } from './who';

/**
 * Chooses a remedy of the plan. One that isn't first says why it goes before the others: what somebody saw weighs more than
 * the ranking, and later it tells how good the ranking was.
 */
export const chooseRepair = defineWrite({
  name: 'choose.repair',
  doing: 'plan repairs',
  roles: PERMITTED['case.work'],
  input: chooseRepairInput,
  run: async ({ tx, ctx, input: { id, caseId, remedyId, whyBefore, plannedOn, assignedTo }, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const known = await lockRepair(tx, { ...of, repairId: id });
    if (known && (known.caseId !== caseId || known.remedyId !== remedyId)) throw conflict('This id belongs to another repair.');
    if (known) {
      unchanged();
      return { id, caseId };
    }
    refuseClosed(head);
    const remedy = compiled.rulebook.remedies.find((one) => one.id === remedyId);
    if (!remedy) throw invalid({ remedyId: "This remedy is not in the case's rulebook." });
    await refuseStranger(tx, { ...of, assignedTo });
    const chosen = new Set((await selectRepairs(tx, of)).filter(({ endedAt }) => endedAt === null).map((row) => row.remedyId));
    const first = (await planned(tx, of, { compiled, labourRatePerHour: head.labourRatePerHour })).find((one) => !chosen.has(one));
    const isFirst = remedyId === first;
    if (!isFirst && !whyBefore) throw invalid({ whyBefore: 'The plan has another first. Say what you saw that puts this before it.' });

    const row = { ...of, id, remedyId, whyBefore: isFirst ? null : whyBefore, plannedOn, assignedTo };
    const written = await insertRepair(tx, { ...row, chosenAt: ctx.now(), chosenBy: ctx.person.id });
    if (!written) throw conflict('This repair is chosen already: go on with it.');
    await tellOfRepair(tx, ctx, { caseId, repairId: id, assignedTo, remedy: remedy.name });
    audit({ entity: 'repair', entityId: id, changed: { caseId, remedyId, whyBefore: row.whyBefore, plannedOn, assignedTo } });
    return { id, caseId };
  },
});

/** The plan's remedies in their order, as the case stands. */
async function planned(tx: Transaction, of: { organisationId: string; caseId: string }, { compiled, labourRatePerHour }: { compiled: CompiledRulebook; labourRatePerHour: number | null }): Promise<string[]> {
  const run = await selectLatestRun(tx, of);
  const findings = findingsForRanking(await selectFindings(tx, of));
  const { causes } = rank(compiled, findings, rankOptions(findings, run?.recordFacts ?? {}));
  return orderNow({ compiled, causes, labourRatePerHour }).steps.map(({ remedyId }) => remedyId);
}
