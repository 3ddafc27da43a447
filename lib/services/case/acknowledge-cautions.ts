import { lockCase } from '@/db/queries/case';
import { insertAcknowledgements } from '@/db/queries/finding';
import { PERMITTED } from '@/lib/auth/permissions';
import { correctedTime } from '@/lib/case/corrected-time';
import { siteDay } from '@/lib/case/site-day';
import { dangersOf } from '@/lib/diagnose/cautions';
import { invalid, notFound } from '@/lib/errors';
import { acknowledgeCautionsInput } from '@/lib/schemas/case';
import { defineWrite } from '../define';
import { compiledEdition } from '../edition/compiled';

/** Notes that a person read cautions today, in the danger of the check at hand. */
export const acknowledgeCautions = defineWrite({
  name: 'acknowledge.caution',
  doing: 'acknowledge cautions',
  roles: PERMITTED['case.work'],
  input: acknowledgeCautionsInput,
  run: async ({ tx, ctx, input, audit, unchanged }) => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    const row = await lockCase(tx, of);
    if (!row) throw notFound('case');
    const compiled = await compiledEdition(tx, { ...of, editionId: row.editionId });
    const check = compiled.checks.get(input.checkId)?.check;
    if (!check || input.cautions.some(({ cautionId }) => !check.cautions.includes(cautionId))) {
      throw invalid({ cautions: 'These are not the cautions of this check.' });
    }
    const at = ctx.now();
    const dangers = dangersOf(check.setUp);
    // Read without a connection last night, it was read last night.
    const onDay = siteDay(input.deviceAt ? correctedTime({ deviceAt: input.deviceAt, clockOffsetMs: input.clockOffsetMs }, at) : at, row.timeZone);
    const written = await insertAcknowledgements(
      tx,
      input.cautions.map(({ id, cautionId }) => ({ ...of, id, cautionId, personId: ctx.person.id, onDay, dangers, at })),
    );
    if (written === 0) unchanged();
    else audit({ entity: 'caution_acknowledgement', entityId: of.caseId, changed: { cautions: input.cautions.map((c) => c.cautionId), dangers, onDay } });
    return input.cautions.map(({ cautionId }) => ({ cautionId, dangers }));
  },
});
