import { sql } from 'drizzle-orm';
import { newId } from '@/lib/ids';
import { listGates } from '@/lib/services/gate/list';
import { makeGate } from '@/lib/services/gate/links';
import { answerGate, enterGate } from '@/lib/services/gate/pass';
import { viewGatePage, type GatePage } from '@/lib/services/gate/view';
import type { Visitor } from '@/lib/services/context';
import type { makeClock } from '@/tests/support/clock';
import type { Tenant } from '@/tests/support/tenant';

export type CheckPage = Extract<GatePage, { step: 'check' }>;
export type VerdictPage = Extract<GatePage, { step: 'verdict' }>;
/** What to answer to a check; null: can't tell. */
export type Answering = (check: CheckPage['check']) => { state?: string; value?: string } | null;

/** A gate of a site with the token of its link. */
export async function makeAGate({ ctx, siteId }: Pick<Tenant, 'ctx' | 'siteId'>, more: { days?: number } = {}) {
  const gateId = newId();
  const asAdministrator = { ...ctx, roles: ['administrator'] as const };
  await makeGate({ ctx: asAdministrator, input: { id: gateId, siteId, name: 'Parts counter', askWhom: 'the workshop desk', ...more } });
  const { gates } = await listGates({ ctx: asAdministrator, input: { siteId } });
  return { gateId, asAdministrator, token: gates.find(({ id }) => id === gateId)?.path?.replace('/gate/', '') ?? '' };
}

/** A unit of the tenant's, in the record. */
export async function makeAUnit({ asOwner, organisationId, siteId }: Tenant, fleetNumber = newId().slice(-8)) {
  const unitId = newId();
  await asOwner((tx) => tx.execute(sql`insert into unit (organisation_id, id, site_id, fleet_number, country, vehicle_kind) values (${organisationId}, ${unitId}, ${siteId}, ${fleetNumber}, 'US', 'truck')`));
  return { unitId, fleetNumber };
}

interface Walk {
  visitor: Visitor;
  token: string;
  fleetNumber: string;
  answer: Answering;
  complaints?: string[];
  clock: ReturnType<typeof makeClock>;
  /** Each answer is sent so often. */
  times?: number;
}

/** Goes through a gate from the number to the verdict. */
export async function walk({ visitor, token, fleetNumber, answer, complaints = ['complaint-oil'], clock, times = 1 }: Walk) {
  const passageId = newId();
  const entered = { token, id: passageId, fleetNumber, name: 'Kim', complaints };
  for (let i = 0; i < times; i++) await enterGate({ visitor, input: entered });
  const asked: CheckPage[] = [];
  for (;;) {
    const page = await viewGatePage({ visitor, input: { token, passageId } });
    if (page.step === 'verdict') return { passageId, asked, page };
    if (page.step !== 'check') throw new Error(`the gate is at ${page.step}`);
    asked.push(page);
    clock.forward(5000);
    const given = answer(page.check);
    const input = { token, passageId, id: newId(), checkId: page.check.id, hasReadCautions: true, ...(given ?? { cannotTell: true }) };
    for (let i = 0; i < times; i++) await answerGate({ visitor, input });
  }
}
