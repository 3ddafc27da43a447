import { findMember } from '@/db/queries/membership';
import { insertRelease, selectReleases } from '@/db/queries/release';
import { lockHold, updateHold } from '@/db/queries/unit-hold';
import type { Transaction } from '@/db/connect';
import { PERMITTED } from '@/lib/auth/permissions';
import { releaseChecks, whyNotReleased, type ReleasedOn } from '@/lib/case/view/release';
import { conflict, forbidden } from '@/lib/errors';
import { releaseUnitInput } from '@/lib/schemas/release';
import { gatherState } from '../case/gather-state';
import { standingHolds } from '../case/holds-of-unit';
import { lockCaseOf } from '../case/locked';
import type { Ctx } from '../context';
import { defineWrite } from '../define';
import { refuseClosed } from '../repair/locked';
import { lastWorkOn } from './since';

/**
 * Releases a unit after its repair: by somebody with the right, when everything that is required was measured after the last
 * work on it and is in order. "Do not release" that has passed is lifted with it, on the same measurements and by the same
 * right; what has not passed refuses it.
 */
export const releaseUnit = defineWrite({
  name: 'release.unit',
  doing: 'release units',
  roles: PERMITTED['case.work'],
  input: releaseUnitInput,
  run: async ({ tx, ctx, input: { id, caseId, note }, audit, unchanged }) => {
    if (!ctx.mayRelease) throw forbidden('release units');
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head } = await lockCaseOf(tx, of);
    if ((await selectReleases(tx, of)).some((row) => row.id === id)) {
      unchanged();
      return { id, caseId };
    }
    refuseClosed(head);
    const { compiled, rows } = await gatherState(tx, ctx, { caseId });
    const checks = releaseChecks({ compiled, rows, since: await lastWorkOn(tx, of), units: ctx.person.units });
    if (checks.length === 0) throw conflict('This case’s edition doesn’t say what to measure before a release. Lift “do not release” on the unit’s page.');
    const whyNot = whyNotReleased(checks);
    if (whyNot) throw conflict(`Not released. ${whyNot}`);
    const holds = await standingHolds(tx, { ...of, unitId: head.unitId });
    const against = [...new Set(holds.filter(({ passedAt }) => passedAt === null).map(({ check }) => check))];
    if (against.length > 0) throw conflict(`Not released. Against the unit still stands: ${against.join(', ')}.`);

    const byId = new Map(rows.map((row) => [row.id, row]));
    const on = checks.flatMap(({ checkId, name, measured }): ReleasedOn[] => {
      const row = measured && byId.get(measured.findingId);
      return row ? [{ checkId, name, findingId: row.id, answer: measured.answer, valueSi: row.valueSi, judgement: row.judgement }] : [];
    });
    const basis = (await findMember(tx, { organisationId: of.organisationId, personId: ctx.person.id }))?.releaseBasis ?? null;
    await insertRelease(tx, { ...of, id, unitId: head.unitId, releasedAt: ctx.now(), releasedBy: ctx.person.id, basis, on, note });
    audit({ entity: 'unit', entityId: head.unitId, changed: { caseId, released: true, basis, note } });
    for (const hold of holds) await liftPassed(tx, ctx, { unitId: head.unitId, holdId: hold.id, on, basis });
    return { id, caseId };
  },
});

/** Lifts a hold that has passed, on what the release measured of its check, or on the answer that passed. */
async function liftPassed(tx: Transaction, ctx: Ctx, { unitId, holdId, on, basis }: { unitId: string; holdId: string; on: readonly ReleasedOn[]; basis: string | null }): Promise<void> {
  const hold = await lockHold(tx, { organisationId: ctx.organisation.id, unitId, holdId });
  if (!hold || hold.endedAt) return;
  const measured = on.find(({ checkId }) => checkId === hold.checkId);
  await updateHold(tx, hold, {
    endedAt: ctx.now(),
    ended: 'lifted',
    endedBy: ctx.person.id,
    liftFound: measured?.answer ?? 'Passed by a later answer, and the unit was released.',
    liftValueSi: measured?.valueSi ?? null,
    liftJudgement: measured?.judgement ?? null,
    liftBasis: basis,
  });
}
