import { selectModelNames } from '@/db/queries/compressor-model';
import { selectFit, selectFitsOfUnit } from '@/db/queries/fit';
import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { fitIdInput } from '@/lib/schemas/fit';
import { unitIdInput } from '@/lib/schemas/unit';
import { siteDay } from '@/lib/case/site-day';
import { defineRead } from '../define';
import { versionOf } from '../editing';
import { textsOf } from '../form-value';
import { fitFormValues } from './form-values';

/** A fit of a unit, and what its form is opened with. */
export const readFit = defineRead({
  name: 'read.fit',
  doing: 'see fits',
  roles: PERMITTED['unit.see'],
  input: fitIdInput,
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const fit = await selectFit(tx, { organisationId, fitId: input.fitId });
    const unit = await selectUnit(tx, { organisationId, unitId: input.unitId });
    if (!fit || !unit || fit.unitId !== unit.id) throw notFound('fit');
    const models = await selectModelNames(tx, organisationId);
    return {
      fit,
      fleetNumber: unit.fleetNumber,
      today: siteDay(ctx.now(), unit.timeZone),
      version: versionOf(fit),
      values: textsOf(fitFormValues(fit, ctx.person.units)),
      // Its own model may be hidden by now.
      models: models.some((model) => model.id === fit.modelId) ? models : [{ id: fit.modelId, name: fit.modelName }, ...models],
    };
  },
});

/** What the form of a new fit is opened with. */
export const readNewFitForm = defineRead({
  name: 'read.new-fit-form',
  doing: 'record fits',
  roles: PERMITTED['unit.edit'],
  input: unitIdInput,
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const unit = await selectUnit(tx, { organisationId, unitId: input.unitId });
    if (!unit) throw notFound('unit');
    const fits = await selectFitsOfUnit(tx, { organisationId, unitId: unit.id });
    const standing = fits.find((fit) => fit.removedOn === null);
    return {
      fleetNumber: unit.fleetNumber,
      today: siteDay(ctx.now(), unit.timeZone),
      standing: standing ? { modelName: standing.modelName, installedOn: standing.installedOn } : null,
      models: await selectModelNames(tx, organisationId),
    };
  },
});
