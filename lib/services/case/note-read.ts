import type { lockCase } from '@/db/queries/case';
import { insertAcknowledgements } from '@/db/queries/finding';
import { siteDay } from '@/lib/case/site-day';
import { dangersOf, type Danger } from '@/lib/diagnose/cautions';
import type { Check } from '@/lib/diagnose/types';
import { invalid } from '@/lib/errors';
import type { Work } from '../define';

interface Read {
  head: Pick<NonNullable<Awaited<ReturnType<typeof lockCase>>>, 'id' | 'timeZone'>;
  /** What the cautions are of: those of anything else are refused. */
  work: Pick<Check, 'cautions' | 'setUp'>;
  what: string;
  cautions: readonly { id: string; cautionId: string }[];
}

/** Notes that a person read the cautions of a piece of work today, in the danger that it is. */
export async function noteRead({ tx, ctx, audit, unchanged }: Pick<Work<unknown>, 'tx' | 'ctx' | 'audit' | 'unchanged'>, { head, work, what, cautions }: Read): Promise<{ cautionId: string; dangers: Danger[] }[]> {
  if (cautions.some(({ cautionId }) => !work.cautions.includes(cautionId))) throw invalid({ cautions: `These are not the cautions of this ${what}.` });
  const of = { organisationId: ctx.organisation.id, caseId: head.id };
  const at = ctx.now();
  const dangers = dangersOf(work.setUp);
  const onDay = siteDay(at, head.timeZone);
  const written = await insertAcknowledgements(tx, cautions.map(({ id, cautionId }) => ({ ...of, id, cautionId, personId: ctx.person.id, onDay, dangers, at })));
  if (written === 0) unchanged();
  else audit({ entity: 'caution_acknowledgement', entityId: head.id, changed: { cautions: cautions.map(({ cautionId }) => cautionId), dangers, onDay } });
  return cautions.map(({ cautionId }) => ({ cautionId, dangers }));
}
