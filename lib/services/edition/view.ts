import { z } from 'zod';
import type { Transaction } from '@/db/connect';
import { selectCaseHead } from '@/db/queries/case';
import { selectPublishedEdition } from '@/db/queries/edition';
import { PERMITTED } from '@/lib/auth/permissions';
import { rulebookView } from '@/lib/case/view/rulebook';
import { conflict, notFound } from '@/lib/errors';
import { readCaseInput } from '@/lib/schemas/case';
import { complaintIds } from '../case/complaints';
import type { Ctx } from '../context';
import { defineRead } from '../define';
import { compiledEdition } from './compiled';

async function viewOf(tx: Transaction, ctx: Ctx, edition: { id: string; number: number }) {
  const compiled = await compiledEdition(tx, { organisationId: ctx.organisation.id, editionId: edition.id });
  const view = rulebookView(compiled, ctx.person.units);
  return { edition, ...view, complaints: complaintIds(compiled).map((id) => ({ id, label: view.checks[id]?.name ?? id })) };
}

/** What the edition in force asks, and with what complaints a case is opened. */
export const viewRulebook = defineRead({
  name: 'view.rulebook',
  doing: 'see the rulebook',
  roles: PERMITTED['case.see'],
  input: z.strictObject({}),
  run: async ({ tx, ctx }) => {
    const edition = await selectPublishedEdition(tx, ctx.organisation.id);
    if (!edition) throw conflict('Your organisation has no rulebook yet. An engineer has to publish one first.');
    return viewOf(tx, ctx, { id: edition.id, number: edition.number });
  },
});

/** What the edition of a case asks: it stays the one that the case was opened with. */
export const viewRulebookOfCase = defineRead({
  name: 'view.rulebook',
  doing: 'see the rulebook',
  roles: PERMITTED['case.see'],
  input: readCaseInput.omit({ at: true }),
  run: async ({ tx, ctx, input }) => {
    const head = await selectCaseHead(tx, { organisationId: ctx.organisation.id, caseId: input.caseId });
    if (!head) throw notFound('case');
    return viewOf(tx, ctx, { id: head.editionId, number: head.editionNumber });
  },
});
