/**
 * The request of an answer (A) against the same request that only inserts and audits (B): session, parse, transaction
 * under row-level security, insert, audit; A also ranks by the engine, keeps the run and chooses the next checks. The
 * case has 20 findings already; the rulebook is the default one.
 */
import { decode, encode } from 'next-auth/jwt';
import { eq } from 'drizzle-orm';
import { connect, type Database } from '@/db/connect';
import { lockCase } from '@/db/queries/case';
import { insertFinding } from '@/db/queries/finding';
import { finding, person } from '@/db/schema';
import { PERMITTED } from '@/lib/auth/permissions';
import { compileRulebook } from '@/lib/diagnose';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { jobs } from '@/lib/jobs';
import { noStorage } from '@/lib/storage/none';
import { recordFindingInput } from '@/lib/schemas/case';
import { openCase } from '@/lib/services/case/open';
import { readAnswer } from '@/lib/case/read-answer';
import { recordFinding } from '@/lib/services/case/record-finding';
import { writingOf } from '@/lib/services/case/writing';
import { defineWrite } from '@/lib/services/define';
import { standingOf } from '@/lib/services/session/standing';
import type { Ctx } from '@/lib/services/context';
import { makeTenant, type Tenant } from '@/tests/support/tenant';
import { makeTemplate, copyTemplate, startThrowAwayCluster } from '../lib/throw-away-cluster.mjs';
import { processKeeper } from '../lib/processes.mjs';
import { stepPrinter } from '../lib/steps.mjs';
import { test } from '../lib/paths.mjs';

const SECRET = 'a secret of the bench alone, 32 characters';
const ALREADY = 20;

const compiled = compileRulebook(defaultRulebook);
/** Checks of the kind that most answers are: a choice, without cautions that have to be read first. */
const checkIds = [...compiled.checks.values()]
  .filter(({ check }) => check.kind === 'choice' && check.cautions.length === 0 && !check.id.startsWith('complaint-'))
  .map(({ id }) => id);

const NEXT_CHECK = checkIds[ALREADY] ?? '';

/** The baseline: what recordFinding does without ranking. */
const insertOnly = defineWrite({
  name: 'record.finding',
  doing: 'answer checks',
  roles: PERMITTED['case.work'],
  input: recordFindingInput,
  run: async ({ tx, ctx, input, audit }) => {
    const of = { organisationId: ctx.organisation.id, caseId: input.caseId };
    if (!(await lockCase(tx, of))) throw notFound('case');
    const check = compiled.checks.get(input.checkId);
    if (!check) throw notFound('check');
    const answer = readAnswer(check, input.answer, writingOf(ctx));
    const at = ctx.now();
    await insertFinding(tx, {
      ...answer, ...of, id: input.id, checkId: input.checkId, stage: input.stage, source: 'asked', askedBecause: input.askedBecause,
      personId: ctx.person.id, deviceAt: new Date(input.deviceAt), clockOffsetMs: 0, correctedAt: at, receivedAt: at,
    });
    audit({ entity: 'finding', entityId: input.id, changed: { caseId: of.caseId, checkId: input.checkId, kind: answer.kind, shares: answer.shares } });
    return { id: input.id };
  },
});

export async function answers(most: number) {
  const processes = processKeeper(test.run);
  const cluster = await startThrowAwayCluster({ processes, steps: stepPrinter() });
  const database = await copyTemplate(cluster, await makeTemplate(cluster));
  const [app, owner] = [connect(database.appUrl), connect(database.ownerUrl)];
  const tenant = await makeTenant({ app: app.db, owner: owner.db, appUrl: database.appUrl, ownerUrl: database.ownerUrl, close: async () => undefined }, { rulebook: defaultRulebook });
  const cookie = await cookieOf(tenant);
  const template = await answeredCase(tenant);
  const copies = async () => Promise.all(Array.from({ length: most }, () => copyOf(template, tenant)));
  const [casesA, casesB] = [await copies(), await copies()];

  /** One answer more in a case that has twenty. */
  const request = async (service: typeof recordFinding | typeof insertOnly, caseId: string | undefined) => {
    const state = compiled.checks.get(NEXT_CHECK)?.stateIds[0];
    const body = JSON.stringify({ id: newId(), checkId: NEXT_CHECK, answer: { kind: 'state', state, sureness: 'sure' }, askedBecause: 'suggested', deviceAt: new Date().toISOString() });
    const ctx = await sessionOf(app.db, cookie);
    JSON.stringify(await service({ ctx, input: { ...JSON.parse(body), caseId } }));
  };
  return {
    a: () => request(recordFinding, casesA.pop()),
    b: () => request(insertOnly, casesB.pop()),
    about: `default rulebook (${compiled.rules.size} rules, ${compiled.checks.size} checks), ${ALREADY} findings there`,
    close: async () => {
      await Promise.all([app.close(), owner.close()]);
      await processes.stopAll();
    },
  };
}

/** A case with twenty answers, each given as a technician gives it. */
async function answeredCase(tenant: Tenant): Promise<string> {
  const id = await openedCase(tenant);
  for (const checkId of checkIds.slice(0, ALREADY)) {
    const state = compiled.checks.get(checkId)?.stateIds[0] ?? '';
    await recordFinding({ ctx: tenant.ctx, input: { id: newId(), caseId: id, checkId, answer: { kind: 'state', state, sureness: 'sure' }, deviceAt: new Date().toISOString() } });
  }
  return id;
}

/** A case with the same answers: copied, because giving them again a hundred times would take minutes. */
async function copyOf(template: string, tenant: Tenant): Promise<string> {
  const id = await openedCase(tenant);
  await tenant.asOwner(async (tx) => {
    const rows = await tx.select().from(finding).where(eq(finding.caseId, template));
    const answers = rows.filter(({ checkId }) => !checkId.startsWith('complaint-'));
    await tx.insert(finding).values(answers.map((row) => ({ ...row, id: newId(), caseId: id, supersedes: null })));
  });
  return id;
}

async function openedCase({ ctx, siteId }: Tenant): Promise<string> {
  const id = newId();
  await openCase({ ctx, input: { id, unit: { kind: 'new', id: newId(), fleetNumber: id, siteId, vehicleKind: 'truck' }, complaints: ['complaint-oil'] } });
  return id;
}

/** The signed-in cookie's token, as next-auth makes it. */
async function cookieOf({ organisationId, personId, asOwner }: Tenant): Promise<string> {
  const [row] = await asOwner((tx) => tx.select({ sessionVersion: person.sessionVersion }).from(person).where(eq(person.id, personId)));
  return encode({ secret: SECRET, token: { sub: personId, organisationId, sessionVersion: row?.sessionVersion ?? 1 } });
}

async function sessionOf(db: Database, cookie: string): Promise<Ctx> {
  const token = await decode({ secret: SECRET, token: cookie });
  const standing = token?.sub && (await standingOf(db, { personId: token.sub, organisationId: token.organisationId, sessionVersion: token.sessionVersion }));
  if (!standing) throw new Error('not signed in');
  return { ...standing, db, now: () => new Date(), jobs, storage: noStorage, signingSecret: SECRET };
}
