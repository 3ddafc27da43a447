import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import type { AnswerInput } from '@/lib/schemas/case';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { openCase } from '@/lib/services/case/open';
import { recordFinding } from '@/lib/services/case/record-finding';
import type { Ctx } from '@/lib/services/context';
import type { TestDatabases } from '@/tests/support/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';

/** An organisation with the default rulebook and a technician. */
export const makeWorkshop = (databases: TestDatabases, options: Parameters<typeof makeTenant>[1] = {}) =>
  makeTenant(databases, { rulebook: defaultRulebook, ...options });

/** A case on a new unit, with oil for its complaint. */
export async function openACase({ ctx, siteId }: Pick<Tenant, 'ctx' | 'siteId'>, more: { odometer?: string } = {}): Promise<string> {
  const id = newId();
  await openCase({
    ctx,
    input: { id, unit: { kind: 'new', id: newId(), fleetNumber: `U-${id.slice(-8)}`, siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'], ...more },
  });
  return id;
}

export const yes: AnswerInput = { kind: 'state', state: 'yes', sureness: 'sure' };
export const no: AnswerInput = { kind: 'state', state: 'no', sureness: 'sure' };

interface Given {
  caseId: string;
  checkId: string;
  answer: AnswerInput;
  id?: string;
  deviceAt?: Date;
  clockOffsetMs?: number;
}

/** Answers without having read what the page makes one read first. */
export const giveUnread = (ctx: Ctx, { id = newId(), deviceAt = ctx.now(), ...given }: Given) =>
  recordFinding({ ctx, input: { id, deviceAt: deviceAt.toISOString(), ...given } });

/** Answers as the page does: the cautions of the check first. */
export async function give(ctx: Ctx, given: Given) {
  await readCautions(ctx, given.caseId, given.checkId);
  return giveUnread(ctx, given);
}

/** Reads all cautions of a check, as the page asks for. */
export async function readCautions(ctx: Ctx, caseId: string, checkId: string): Promise<void> {
  const cautions = defaultRulebook.checks.find(({ id }) => id === checkId)?.cautions ?? [];
  if (cautions.length === 0) return;
  await acknowledgeCautions({ ctx, input: { caseId, checkId, cautions: cautions.map((cautionId) => ({ id: newId(), cautionId })) } });
}
