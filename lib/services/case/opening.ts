import { z } from 'zod';
import { selectPublishedEdition } from '@/db/queries/edition';
import { listSites } from '@/db/queries/site';
import { selectUnit } from '@/db/queries/unit';
import { PERMITTED } from '@/lib/auth/permissions';
import { conflict } from '@/lib/errors';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';
import { complaintIds } from './complaints';

/** What the form that opens a case offers: complaints of the edition in force, sites, and the unit if one is given. */
export const readOpening = defineRead({
  name: 'read.opening',
  doing: 'open cases',
  roles: PERMITTED['case.work'],
  input: z.strictObject({ unitId: z.uuid().optional().catch(undefined) }),
  run: async ({ tx, ctx, input }) => {
    const organisationId = ctx.organisation.id;
    const edition = await selectPublishedEdition(tx, organisationId);
    if (!edition) throw conflict('Your organisation has no rulebook yet. An engineer has to publish one first.');
    const compiled = await compiledEdition(tx, { organisationId, editionId: edition.id });
    const unit = input.unitId ? await selectUnit(tx, { organisationId, unitId: input.unitId }) : undefined;
    return {
      complaints: complaintIds(compiled).map((id) => ({ id, label: compiled.checks.get(id)?.check.name ?? id })),
      sites: (await listSites(tx, { organisationId })).map(({ id, name }) => ({ id, name })),
      unit: unit ? { id: unit.id, fleetNumber: unit.fleetNumber, siteName: unit.siteName } : null,
    };
  },
});
