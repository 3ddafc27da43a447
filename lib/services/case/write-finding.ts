import type { Transaction } from '@/db/connect';
import { updateCase, type lockCase } from '@/db/queries/case';
import { insertFinding, selectAcknowledgements, selectFindingNotes, type FindingRow } from '@/db/queries/finding';
import { selectLatestRun } from '@/db/queries/run';
import type { Writing } from '@/lib/bench/read-texts';
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
import type { Check, Stage } from '@/lib/diagnose/types';
import { conflict, invalid } from '@/lib/errors';
import type { z } from 'zod';
import type { recordFindingInput } from '@/lib/schemas/case';
import type { CaseState } from '@/lib/schemas/case-view';
import type { Ctx } from '../context';
import { baselinesOfCase } from '../baseline/of-case';
import type { Work } from '../define';
import { limitsOfCase } from '../limit/of-case';
import { holdAfterAnswer } from '../unit-hold/after-answer';
import { gatherState } from './gather-state';
import { makeRun } from './run-of-record';
import { writingOf } from './writing';

interface Given {
  /** Locked, so that runs of one case follow each other. */
  head: NonNullable<Awaited<ReturnType<typeof lockCase>>>;
  compiled: CompiledRulebook;
  /** All findings until now. */
  rows: readonly FindingRow[];
  input: Pick<z.output<typeof recordFindingInput>, 'id' | 'checkId' | 'stage' | 'answer' | 'askedBecause' | 'deviceAt' | 'clockOffsetMs'>;
  /** How measures are written in it; as the person does where nothing is said. */
  writing?: Writing;
  /** Worked out anew from what was measured before: nobody goes near the vehicle for it, so that there is nothing to read first. */
  atTheDesk?: boolean;
}

/** Writes an answer into an open case, with all that follows from it: what stands against the unit, and the ranking. */
export async function writeFinding({ tx, ctx, audit }: Pick<Work<unknown>, 'tx' | 'ctx' | 'audit'>, { head, compiled, rows, input, writing = writingOf(ctx), atTheDesk = false }: Given): Promise<CaseState> {
  const of = { organisationId: ctx.organisation.id, caseId: head.id };
  const check = compiled.checks.get(input.checkId);
  if (!check) throw invalid({ checkId: "This check is not in the case's rulebook." });
  const measures = input.answer.kind === 'measured' || input.answer.kind === 'sum';
  const limits = measures ? await limitsOfCase(tx, { ...of, checkId: input.checkId }) : undefined;
  const answer = readAnswer(check, input.answer, writing, limits?.get(input.checkId));
  const receivedAt = ctx.now();
  const correctedAt = correctedTime(input, receivedAt);
  const says = answer.shares.length > 0;
  if (says && !atTheDesk) await refuseUnread(tx, ctx, { head, compiled, check: check.check, at: correctedAt });

  const dated = { id: input.id, checkId: input.checkId, stage: input.stage, correctedAt, receivedAt };
  const { standing, late } = arriving(dated, rows);
  const baselines = check.check.compares && answer.valueSi !== null ? await baselinesOfCase(tx, { ...of, head, compiled, now: receivedAt }) : {};
  const finding = { ...answer, ...dated, baseline: comparedWith(input.checkId, answer, baselines), source: sourceOf(input.stage, answer.sum !== null), askedBecause: input.askedBecause, late };
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

  audit({
    entity: 'finding',
    entityId: input.id,
    changed: { caseId: of.caseId, checkId: input.checkId, stage: input.stage, kind: answer.kind, shares: answer.shares, valueTyped: answer.valueTyped },
  });
  // A reading for a release or a watch ranks nothing.
  if (input.stage.kind === 'release' || input.stage.kind === 'watch') return buildState(await gatherState(tx, ctx, of));

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
}

/** What is seen when something is opened comes from the repair, whether it was looked at or worked out. */
const sourceOf = (stage: Stage, isSum: boolean) => (stage.kind === 'after-remedy' ? 'remedy' : isSum ? 'sum' : 'asked');

export const takenId = () => conflict('This id belongs to another finding.');

/** What this person had read on the day of an answer: one that comes late was given by the cautions of its own day. */
function acknowledgedOn(tx: Transaction, ctx: Ctx, { id, timeZone }: { id: string; timeZone: string }, at: Date) {
  return selectAcknowledgements(tx, {
    organisationId: ctx.organisation.id,
    caseId: id,
    personId: ctx.person.id,
    onDay: siteDay(at, timeZone),
  });
}

interface ToDo {
  head: { id: string; timeZone: string };
  compiled: CompiledRulebook;
  check: Pick<Check, 'cautions' | 'setUp'>;
  at?: Date;
}

/** Throws unless this person has read the cautions of a check on the day on which it is done. */
export async function refuseUnread(tx: Transaction, ctx: Ctx, { head, compiled: { rulebook }, check, at = ctx.now() }: ToDo): Promise<void> {
  const worseWhen = (id: string) => rulebook.cautions.find((caution) => caution.id === id)?.worseWhen ?? [];
  const unread = cautionsToRead(check, worseWhen, await acknowledgedOn(tx, ctx, head, at));
  if (unread.length > 0) throw conflict('Read and acknowledge the cautions first.', { cautions: unread.join(' ') });
}
