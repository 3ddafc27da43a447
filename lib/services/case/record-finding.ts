import type { Transaction } from '@/db/connect';
import { lockCase, updateCase } from '@/db/queries/case';
import { insertFinding, selectAcknowledgements, selectFindingNotes, selectFindings } from '@/db/queries/finding';
import { selectLatestRun } from '@/db/queries/run';
import { PERMITTED } from '@/lib/auth/permissions';
import { buildState } from '@/lib/case/build-state';
import { correctedTime } from '@/lib/case/corrected-time';
import { arriving } from '@/lib/case/current-findings';
import { findingsForRanking } from '@/lib/case/findings-for-ranking';
import { readAnswer } from '@/lib/case/read-answer';
import { releaseHolds } from '@/lib/case/release-holds';
import { siteDay } from '@/lib/case/site-day';
import { vehicleAfter } from '@/lib/case/vehicle-after';
import { comparedWith } from '@/lib/case/view/usual';
import type { CompiledRulebook } from '@/lib/diagnose';
import { cautionsToRead } from '@/lib/diagnose/cautions';
import type { Check } from '@/lib/diagnose/types';
import { conflict, invalid, notFound } from '@/lib/errors';
import { recordFindingInput } from '@/lib/schemas/case';
import type { CaseState } from '@/lib/schemas/case-view';
import type { Ctx } from '../context';
import { baselinesOfCase } from '../baseline/of-case';
import { defineWrite } from '../define';
import { compiledEdition } from '../edition/compiled';
import { limitsOfCase } from '../limit/of-case';
import { holdAfterAnswer } from '../unit-hold/after-answer';
import { gatherState } from './gather-state';
import { makeRun } from './run-of-record';
import { writingOf } from './writing';

/**
 * Writes the answer to a check and ranks anew. The id is the client's: the same request sent twice writes once and
 * is answered alike. An answer older than the one that stands is kept, but isn't current.
 */
export const recordFinding = defineWrite({
  name: 'record.finding',
  doing: 'answer checks',
  roles: PERMITTED['case.work'],
  input: recordFindingInput,
  run: async ({ tx, ctx, input, audit, unchanged }): Promise<CaseState> => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const head = await lockCase(tx, of);
    if (!head) throw notFound('case');
    const compiled = await compiledEdition(tx, { ...of, editionId: head.editionId });

    const rows = await selectFindings(tx, of);
    const known = rows.find((row) => row.id === input.id);
    if (known) {
      if (known.checkId !== input.checkId) throw takenId();
      unchanged();
      return buildState(await gatherState(tx, ctx, { caseId: of.caseId }));
    }
    if (head.status !== 'open') throw conflict('This case has been called. Reopen it to go on.');

    const check = compiled.checks.get(input.checkId);
    if (!check) throw invalid({ checkId: "This check is not in the case's rulebook." });
    const measures = input.answer.kind === 'measured' || input.answer.kind === 'sum';
    const limits = measures ? await limitsOfCase(tx, { ...of, checkId: input.checkId }) : undefined;
    const answer = readAnswer(check, input.answer, writingOf(ctx), limits?.get(input.checkId));
    const receivedAt = ctx.now();
    const correctedAt = correctedTime(input, receivedAt);
    const acknowledged = await acknowledgedOn(tx, ctx, head, correctedAt);
    const says = answer.shares.length > 0;
    if (says) refuseUnreadCautions(compiled, check.check, acknowledged);

    const dated = { id: input.id, checkId: input.checkId, stage: input.stage, correctedAt, receivedAt };
    const { standing, late } = arriving(dated, rows);
    const baselines = check.check.compares && answer.valueSi !== null ? await baselinesOfCase(tx, { ...of, head, compiled, now: receivedAt }) : {};
    const finding = { ...answer, ...dated, baseline: comparedWith(input.checkId, answer, baselines), source: answer.sum ? 'sum' : 'asked', askedBecause: input.askedBecause, late };
    const written = await insertFinding(tx, {
      ...finding,
      ...of,
      personId: ctx.person.id,
      deviceAt: new Date(input.deviceAt),
      clockOffsetMs: input.clockOffsetMs,
      supersedes: late ? null : (standing?.id ?? null),
    });
    if (!written) throw takenId();
    const vehicleState = says ? vehicleAfter(head.vehicleState, check.check.setUp) : head.vehicleState;
    const rowsNow = [...rows, { ...finding, person: ctx.person.name }];
    const held = releaseHolds(compiled, rowsNow);
    await updateCase(tx, of, { vehicleState, releaseHolds: held });
    await holdAfterAnswer(tx, {
      ...of,
      unitId: head.unitId,
      personId: ctx.person.id,
      check,
      finding: { ...finding, says },
      holds: held.includes(check.id),
      at: receivedAt,
    });

    const previous = await selectLatestRun(tx, of);
    const run = await makeRun(tx, {
      ...of,
      editionId: head.editionId,
      compiled,
      findings: findingsForRanking(rowsNow),
      recordFacts: previous?.recordFacts ?? {},
      becauseOf: input.id,
      at: receivedAt,
    });
    audit({
      entity: 'finding',
      entityId: input.id,
      changed: { caseId: of.caseId, checkId: input.checkId, kind: answer.kind, shares: answer.shares, valueTyped: answer.valueTyped },
    });
    return buildState({
      compiled,
      head: { ...head, version: head.version + 1, vehicleState },
      rows: rowsNow,
      notes: await selectFindingNotes(tx, of),
      run,
      previous: previous?.result ?? null,
      acknowledged: await acknowledgedOn(tx, ctx, head, receivedAt),
      units: ctx.person.units,
      at: null,
    });
  },
});

const takenId = () => conflict('This id belongs to another finding.');

/** What this person had read on the day of an answer: one that comes late was given by the cautions of its own day. */
function acknowledgedOn(tx: Transaction, ctx: Ctx, { id, timeZone }: { id: string; timeZone: string }, at: Date) {
  return selectAcknowledgements(tx, {
    organisationId: ctx.organisation.id,
    caseId: id,
    personId: ctx.person.id,
    onDay: siteDay(at, timeZone),
  });
}

function refuseUnreadCautions({ rulebook }: CompiledRulebook, check: Check, acknowledged: CaseState['acknowledged']): void {
  const worseWhen = (id: string) => rulebook.cautions.find((caution) => caution.id === id)?.worseWhen ?? [];
  const unread = cautionsToRead(check, worseWhen, acknowledged);
  if (unread.length > 0) throw conflict('Read and acknowledge the cautions of this check first.', { cautions: unread.join(' ') });
}
