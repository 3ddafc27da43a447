import { selectCaseHead } from '@/db/queries/case';
import { selectAcknowledgements, selectFindingNotes, selectFindings } from '@/db/queries/finding';
import { selectLastRuns } from '@/db/queries/run';
import { PERMITTED } from '@/lib/auth/permissions';
import { siteDay } from '@/lib/case/site-day';
import { notFound } from '@/lib/errors';
import { readCaseInput } from '@/lib/schemas/case';
import type { CaseKit } from '@/lib/schemas/case-kit';
import { baselinesOfCase } from '../baseline/of-case';
import { defineRead } from '../define';
import { limitsOfCase } from '../limit/of-case';
import { compiledEdition } from '../edition/compiled';
import { writingOf } from './writing';

/** What a device needs to go on with a case without us; the rulebook comes with its edition. */
export const readCaseKit = defineRead({
  name: 'read.case',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: readCaseInput.omit({ at: true }),
  run: async ({ tx, ctx, input }): Promise<CaseKit> => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const head = await selectCaseHead(tx, of);
    if (!head) throw notFound('case');
    const rows = await selectFindings(tx, of);
    const notes = await selectFindingNotes(tx, of);
    const [run, previous] = await selectLastRuns(tx, of);
    if (!run) throw notFound('state of the case');
    const compiled = await compiledEdition(tx, { ...of, editionId: head.editionId });
    const acknowledgedOn = siteDay(ctx.now(), head.timeZone);
    return {
      ...of,
      editionId: head.editionId,
      personId: ctx.person.id,
      version: head.version,
      status: head.status,
      vehicleState: head.vehicleState,
      labourRatePerHour: head.labourRatePerHour,
      timeZone: head.timeZone,
      rows: rows.map((row) => ({ ...row, correctedAt: row.correctedAt.toISOString(), receivedAt: row.receivedAt.toISOString() })),
      notes: notes.map((note) => ({ ...note, at: note.at.toISOString() })),
      baselines: await baselinesOfCase(tx, { ...of, head, compiled, now: ctx.now() }),
      run: { id: run.id, recordFacts: run.inputs.recordFacts, becauseOf: run.becauseOf },
      previous: previous?.result.causes.map(({ causeId, p }) => ({ causeId, p })) ?? null,
      acknowledged: await selectAcknowledgements(tx, { ...of, personId: ctx.person.id, onDay: acknowledgedOn }),
      acknowledgedOn,
      limits: Object.fromEntries(await limitsOfCase(tx, of)),
      person: { name: ctx.person.name, ...writingOf(ctx) },
    };
  },
});
