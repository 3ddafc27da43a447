import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { dangersOf } from '@/lib/diagnose/cautions';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { acknowledgeCautions } from '@/lib/services/case/acknowledge-cautions';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import type { Tenant } from '@/tests/support/tenant';
import { giveUnread as give, makeWorkshop, openACase, readCautions } from './support';

const careful = defaultRulebook.checks.find(({ id }) => id === 'build-up-time');
const answer = { kind: 'measured', value: '30 s', sureness: 'sure' } as const;

describe('cautions', () => {
  let databases: TestDatabases;
  let workshop: Tenant;
  let now = new Date('2026-03-10T15:00:00Z');
  beforeAll(async () => {
    databases = await openTestDatabases();
    workshop = await makeWorkshop(databases, { now: () => now, timeZone: 'America/Chicago' });
  });
  afterAll(() => databases.close());

  it('stand before a check whose work can hurt', () => {
    expect(careful?.cautions.length).toBeGreaterThan(0);
    expect(dangersOf(careful?.setUp ?? {})).toContain('engine-running');
  });

  it('must be read before an answer is taken, by each person', async () => {
    const caseId = await openACase(workshop);
    await expect(give(workshop.ctx, { caseId, checkId: 'build-up-time', answer })).rejects.toMatchObject({ code: 'conflict', message: expect.stringContaining('cautions') });
    await readCautions(workshop.ctx, caseId, 'build-up-time');
    await expect(give(workshop.ctx, { caseId, checkId: 'build-up-time', answer })).resolves.toMatchObject({ caseId });
    const colleague = await workshop.addPerson();
    await expect(give(colleague, { caseId, checkId: 'build-up-time', answer })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('are asked again on the next day of the site', async () => {
    const caseId = await openACase(workshop);
    now = new Date('2026-03-11T04:30:00Z'); // 23:30 in Chicago, the evening before
    await readCautions(workshop.ctx, caseId, 'build-up-time');
    now = new Date('2026-03-11T05:30:00Z'); // half past midnight
    await expect(give(workshop.ctx, { caseId, checkId: 'build-up-time', answer })).rejects.toMatchObject({ code: 'conflict' });
  });

  it('need not be read to say that one cannot tell, or to skip', async () => {
    const caseId = await openACase(workshop);
    await expect(give(workshop.ctx, { caseId, checkId: 'build-up-time', answer: { kind: 'skip' } })).resolves.toMatchObject({ caseId });
  });

  it('can only be acknowledged for the check that has them', async () => {
    const caseId = await openACase(workshop);
    const input = { caseId, checkId: 'oil-at-purge', cautions: [{ id: newId(), cautionId: 'no-such-caution' }] };
    await expect(acknowledgeCautions({ ctx: workshop.ctx, input })).rejects.toMatchObject({ code: 'invalid' });
  });

  it('are of their own organisation', async () => {
    const caseId = await openACase(workshop);
    const other = await makeWorkshop(databases, { now: () => now });
    await expect(readCautions(other.ctx, caseId, 'build-up-time')).rejects.toMatchObject({ code: 'not-found' });
  });
});
