import { insertBreakInEvent, insertBreakInRun, selectBreakInEvents, selectBreakInRuns, updateBreakInRun } from '@/db/queries/break-in';
import { selectFit, updateFit } from '@/db/queries/fit';
import { PERMITTED } from '@/lib/auth/permissions';
import { missingForDone } from '@/lib/break-in';
import { correctedTime } from '@/lib/case/corrected-time';
import { conflict, invalid } from '@/lib/errors';
import { breakInEventInput, endBreakInInput, hotCheckInput, startBreakInInput } from '@/lib/schemas/break-in';
import { lockCaseOf } from '../case/locked';
import { refuseUnread } from '../case/write-finding';
import type { Ctx } from '../context';
import { defineWrite, type Work } from '../define';
import { refuseClosed } from '../repair/locked';
import { readMeasure } from '../units-of-measure';
import { breakInRunOf, breakInWork, compressorOf, figuresFor, runOf } from './work';

const DOING = { doing: 'run compressors in', roles: PERMITTED['case.work'] };

/** Begins a break-in run: its figures are kept with it. The cautions have to be read on the day, for a running engine. */
export const startBreakIn = defineWrite({
  name: 'start.break-in',
  ...DOING,
  input: startBreakInInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const { id, caseId } = input;
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    if ((await selectBreakInRuns(tx, of)).some((row) => row.id === id)) {
      unchanged();
      return { id, caseId };
    }
    refuseClosed(head);
    const compressor = await compressorOf(tx, { ...of, unitId: head.unitId });
    if (!compressor) throw conflict('No compressor is on this unit’s record. Record it first, or fit one in this case.');
    const figures = figuresFor(compiled, compressor.model);
    if (!figures) throw conflict('This case’s edition gives no figures for a break-in run.');
    const at = timeOf(ctx, input);
    await refuseUnread(tx, ctx, { head, compiled, check: breakInWork(compiled), at });
    const written = await insertBreakInRun(tx, { ...of, id, fitId: compressor.fitId, figures, startedAt: at, startedBy: ctx.person.id });
    if (!written) throw conflict('A break-in run is under way in this case already.');
    audit({ entity: 'break_in_run', entityId: id, changed: { caseId, fitId: compressor.fitId, figures } });
    return { id, caseId };
  },
});

/** Notes a pause and why, that it goes on, or a pressure that was read. What a device had before the end is taken after it too. */
export const addBreakInEvent = defineWrite({
  name: 'note.break-in',
  ...DOING,
  input: breakInEventInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const { id, caseId, runId, kind, reason } = input;
    const of = { organisationId: ctx.organisation.id, caseId };
    await lockCaseOf(tx, of);
    const row = await breakInRunOf(tx, { ...of, runId });
    const known = (await selectBreakInEvents(tx, of)).find((event) => event.id === id);
    if (known) {
      if (known.runId !== runId || known.kind !== kind) throw conflict('This id belongs to something else.');
      unchanged();
      return { id, caseId };
    }
    const at = timeOf(ctx, input);
    if (row.endedAt && at > row.endedAt) throw conflict('This run is over.');
    if (kind === 'pause' && !reason) throw invalid({ reason: 'Say why it stands still.' });
    const pressure = kind === 'reading' ? pressureOf(ctx, input.pressure) : null;
    const written = await insertBreakInEvent(tx, {
      ...of,
      id,
      runId,
      kind,
      reason: kind === 'pause' ? reason : null,
      pressureTyped: pressure?.asTyped ?? null,
      pressurePa: pressure?.si ?? null,
      personId: ctx.person.id,
      at,
      receivedAt: ctx.now(),
    });
    if (!written) throw conflict('This id belongs to something else.');
    audit({ entity: 'break_in_run', entityId: runId, changed: { caseId, kind, reason, pressure: pressure?.asTyped ?? null } });
    return { id, caseId };
  },
});

/** Ends a run: done, when it ran long enough and was read; or stopped, with why. The fit's record says which. */
export const endBreakIn = defineWrite({
  name: 'end.break-in',
  ...DOING,
  input: endBreakInInput,
  run: async (work) => {
    const { tx, ctx, input, audit, unchanged } = work;
    const { caseId, runId, outcome, whyStopped } = input;
    const of = { organisationId: ctx.organisation.id, caseId };
    await lockCaseOf(tx, of);
    const row = await breakInRunOf(tx, { ...of, runId });
    if (row.endedAt) {
      if (row.outcome !== outcome) throw conflict('This run is over already.');
      unchanged();
      return { id: runId, caseId };
    }
    const at = timeOf(ctx, input);
    const missing = missingForDone(runOf(row, await selectBreakInEvents(tx, of)), row.figures, at.getTime());
    if (outcome === 'done' && missing.length > 0) throw conflict(`Not done yet. ${missing.join(' ')}`);
    if (outcome === 'stopped' && !whyStopped) throw invalid({ whyStopped: 'Say why it was stopped.' });
    await updateBreakInRun(tx, { ...of, runId }, { endedAt: at, endedBy: ctx.person.id, outcome, whyStopped: outcome === 'stopped' ? whyStopped : null });
    audit({ entity: 'break_in_run', entityId: runId, changed: { caseId, outcome, reason: whyStopped } });
    await keepOnFit(work, row.fitId, outcome === 'done' ? 'yes' : 'no');
    return { id: runId, caseId };
  },
});

/** What was seen for leaks while everything was hot. A leak says where; looked again later, the last look holds. */
export const lookHot = defineWrite({
  name: 'look-hot.break-in',
  ...DOING,
  input: hotCheckInput,
  run: async ({ tx, ctx, input: { caseId, runId, oil, coolant, where }, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId };
    refuseClosed((await lockCaseOf(tx, of)).head);
    const row = await breakInRunOf(tx, { ...of, runId });
    if (!row.endedAt) throw conflict('Look when the run is over, while it is hot.');
    if ((oil === 'leak' || coolant === 'leak') && !where) throw invalid({ where: 'Say where it leaks.' });
    await updateBreakInRun(tx, { ...of, runId }, { hotCheck: { oil, coolant, where } });
    audit({ entity: 'break_in_run', entityId: runId, changed: { caseId, oil, coolant, where } });
    return { id: runId, caseId };
  },
});

const timeOf = (ctx: Ctx, { deviceAt, clockOffsetMs }: { deviceAt?: string; clockOffsetMs: number }): Date => (deviceAt ? correctedTime({ deviceAt, clockOffsetMs }, ctx.now()) : ctx.now());

function pressureOf(ctx: Ctx, typed: string | null) {
  if (!typed) throw invalid({ pressure: 'Enter the pressure that you read.' });
  const read = readMeasure(ctx, typed, { quantity: 'pressure' });
  if (!read.ok) throw invalid({ pressure: read.message });
  return read;
}

async function keepOnFit({ tx, ctx, audit }: Work<unknown>, fitId: string, breakInRun: 'yes' | 'no'): Promise<void> {
  const of = { organisationId: ctx.organisation.id, fitId };
  const fit = await selectFit(tx, of);
  // A run that was done stays done, whatever came of a later one.
  if (!fit || fit.breakInRun === breakInRun || fit.breakInRun === 'yes') return;
  await updateFit(tx, of, { breakInRun, updatedAt: ctx.now() });
  audit({ entity: 'fit', entityId: fitId, changed: { breakInRun } });
}
