import { z } from 'zod';
import { selectPublishedEdition } from '@/db/queries/edition';
import { PERMITTED } from '@/lib/auth/permissions';
import { defineRead } from '../define';
import { compiledEdition } from '../edition/compiled';
import { complaintIds } from './complaints';

/** The complaints of the edition in force, to filter by; none before the first edition. */
export const listComplaints = defineRead({
  name: 'list.complaint',
  doing: 'see cases',
  roles: PERMITTED['case.see'],
  input: z.object({}),
  run: async ({ tx, ctx }) => {
    const organisationId = ctx.organisation.id;
    const edition = await selectPublishedEdition(tx, organisationId);
    if (!edition) return [];
    const compiled = await compiledEdition(tx, { organisationId, editionId: edition.id });
    return complaintIds(compiled).map((id) => ({ id, name: compiled.checks.get(id)?.check.name ?? id }));
  },
});
