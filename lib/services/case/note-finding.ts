import { insertFindingNote, selectFindingCase } from '@/db/queries/finding';
import { PERMITTED } from '@/lib/auth/permissions';
import { notFound } from '@/lib/errors';
import { noteFindingInput } from '@/lib/schemas/case';
import { defineWrite } from '../define';

/** Puts words beside a finding, at any time: they are a record, not an answer. */
export const noteFinding = defineWrite({
  name: 'note.finding',
  doing: 'write notes on findings',
  roles: PERMITTED['case.work'],
  input: noteFindingInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const organisationId = ctx.organisation.id;
    const held = await selectFindingCase(tx, { organisationId, findingId: input.findingId });
    if (held?.caseId !== input.caseId) throw notFound('finding');
    const at = ctx.now();
    const written = await insertFindingNote(tx, { ...input, organisationId, personId: ctx.person.id, createdAt: at });
    if (written) audit({ entity: 'finding_note', entityId: input.id, changed: { findingId: input.findingId, text: input.text } });
    else unchanged();
    return { id: input.id, findingId: input.findingId, text: input.text, person: ctx.person.name, at: at.toISOString() };
  },
});
