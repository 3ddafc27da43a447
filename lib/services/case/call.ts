import { insertCall, insertCaseEvent, lockCase, selectCalls, updateCase } from '@/db/queries/case';
import { selectLatestRun } from '@/db/queries/run';
import { PERMITTED } from '@/lib/auth/permissions';
import { SOMETHING_ELSE } from '@/lib/diagnose';
import { conflict, invalid, notFound, type FieldErrors } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { callCauseInput } from '@/lib/schemas/case';
import { defineWrite } from '../define';
import { refuseOldVersion } from '../editing';
import { compiledEdition } from '../edition/compiled';

/**
 * Names the cause of a case: one main, others contributing, with how sure one is, and why when it isn't the one that
 * leads. The ranking that stood is kept with it, so that only what was predicted before is scored later.
 */
export const callCause = defineWrite({
  name: 'call.case',
  doing: 'name the cause of a case',
  roles: PERMITTED['case.work'],
  input: callCauseInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const row = await lockCase(tx, of);
    if (!row) throw notFound('case');
    const calls = await selectCalls(tx, of);
    if (calls.some((call) => call.id === input.id)) {
      unchanged();
      return { id: input.id };
    }
    refuseOldVersion(row.version, { decidedOn: input.version, what: 'case' });
    if (row.status !== 'open') throw conflict('This case has been called already. Reopen it to call it anew.');

    const compiled = await compiledEdition(tx, { ...of, editionId: row.editionId });
    const latest = await selectLatestRun(tx, of);
    const leader = latest?.result.causes[0]?.causeId;
    const fields = problemsOf(input, new Set(compiled.causeIds), leader);
    if (Object.keys(fields).length > 0) throw invalid(fields);

    const at = ctx.now();
    const written = await insertCall(tx, {
      ...of,
      id: input.id,
      mainCause: input.mainCause,
      contributingCauses: input.contributingCauses,
      sureness: input.sureness,
      whyNotLeading: input.whyNotLeading || null,
      unlistedCause: input.unlistedCause || null,
      runId: latest?.id ?? null,
      supersedes: calls.at(-1)?.id ?? null,
      personId: ctx.person.id,
      at,
    });
    if (!written) throw conflict('This id belongs to another call.');
    await insertCaseEvent(tx, { ...of, id: newId(at.getTime()), kind: 'called', callId: input.id, personId: ctx.person.id, at });
    await updateCase(tx, of, { status: 'called' });
    audit({
      entity: 'call',
      entityId: input.id,
      changed: { caseId: of.caseId, mainCause: input.mainCause, contributingCauses: input.contributingCauses, sureness: input.sureness },
    });
    return { id: input.id };
  },
});

interface Called {
  mainCause: string;
  contributingCauses: string[];
  whyNotLeading?: string;
  unlistedCause?: string;
}

function problemsOf({ mainCause, contributingCauses, whyNotLeading, unlistedCause }: Called, known: ReadonlySet<string>, leader?: string): FieldErrors {
  const fields: FieldErrors = {};
  if (!known.has(mainCause)) fields.mainCause = "This cause is not in the case's rulebook.";
  if (contributingCauses.some((cause) => !known.has(cause))) fields.contributingCauses = "One of these causes is not in the case's rulebook.";
  if (contributingCauses.includes(mainCause)) fields.contributingCauses = 'The main cause need not be named again here.';
  if (new Set(contributingCauses).size < contributingCauses.length) fields.contributingCauses = 'Each cause once.';
  if (leader && mainCause !== leader && !whyNotLeading) fields.whyNotLeading = 'This cause does not lead. Say what you saw that decides it.';
  if (mainCause === SOMETHING_ELSE && !unlistedCause) fields.unlistedCause = 'Say what it was, in your own words.';
  return fields;
}
