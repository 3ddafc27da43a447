import { insertFitting, selectFittings } from '@/db/queries/fitting';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict } from '@/lib/errors';
import { createFitInput } from '@/lib/schemas/fit';
import { startFittingInput } from '@/lib/schemas/fitting';
import { lockCaseOf } from '../case/locked';
import { refuseUnread } from '../case/write-finding';
import { defineWrite } from '../define';
import { writeFit } from '../fit/create';
import { refuseClosed } from '../repair/locked';
import { fittingWork } from './work';

/**
 * Begins the fitting of a compressor: what goes on is on the unit's record from now, what comes off is off, and why. How it
 * is fitted follows point by point. The cautions of a fitting have to be read on the day.
 */
export const startFitting = defineWrite({
  name: 'start.fitting',
  doing: 'fit compressors',
  roles: PERMITTED['case.work'],
  input: startFittingInput,
  run: async (work) => {
    const { tx, ctx, audit, unchanged, input } = work;
    const { id, caseId, newFitId: fitId, ...typed } = input;
    const of = { organisationId: ctx.organisation.id, caseId };
    const { head, compiled } = await lockCaseOf(tx, of);
    const known = (await selectFittings(tx, of)).find((row) => row.id === id);
    if (known) {
      unchanged();
      return { id, caseId, fitId: known.fitId };
    }
    refuseClosed(head);
    await refuseUnread(tx, ctx, { head, compiled, check: fittingWork(compiled) });
    await writeFit({ ...work, input: createFitInput.parse({ ...typed, id: fitId, unitId: head.unitId }) });
    const written = await insertFitting(tx, { ...of, id, fitId, startedAt: ctx.now(), startedBy: ctx.person.id });
    if (!written) throw conflict('A compressor is being fitted in this case already. Finish that first.');
    audit({ entity: 'fitting', entityId: id, changed: { caseId, fitId, modelId: typed.modelId } });
    return { id, caseId, fitId };
  },
});
