import { createHash } from 'node:crypto';
import { sql } from 'drizzle-orm';
import sharp from 'sharp';
import { asTenant } from '@/db/connect';
import { attachment, attempt } from '@/db/schema';
import { newId } from '@/lib/ids';
import { jobs, type JobName } from '@/lib/jobs';
import { makeDossier } from '@/lib/services/dossier/make';
import { dossierKey } from '@/lib/services/dossier/object-key';
import { viewInvitation } from '@/lib/services/invitation/accept';
import { invite } from '@/lib/services/invitation/invite';
import { viewPasswordReset } from '@/lib/services/password/reset';
import { objectKey } from '@/lib/services/photo/object-key';
import { startCatch } from '@/lib/services/oil-catch/start';
import { makeWorkshop, openACase, readCautions } from '@/tests/integration/cases/support';
import type { TestDatabases } from '@/tests/support/context';
import type { TestStorage } from '@/tests/support/storage';
import { makeTenant, makeVisitor } from '@/tests/support/tenant';
import type { Letter, PostOffice } from '@/tests/integration/mail/post-office';
import { callCause } from '@/lib/services/case/call';
import { startWatch } from '@/lib/services/watch/start';
import { notify } from '@/lib/services/notice/notify';

export interface Ground {
  databases: TestDatabases;
  storage: TestStorage;
  office: PostOffice;
}

/** A job that a worker is to be killed over. */
export interface Task {
  /** In the data of the job, and in that of no other. */
  marker: string;
  /** Where its mail goes, if it sends any. */
  address?: string;
  /** Whether what it does is noted as done, so that it will not be done again. */
  isNoted: () => Promise<boolean>;
  /** What is wrong with what came of it: to be empty. */
  problems: (letters: readonly Letter[]) => Promise<string[]>;
}

type Tasks = (ground: Ground) => Promise<() => Promise<Task>>;

const AN_HOUR_MS = 3_600_000;
const problemsOf = (facts: Record<string, boolean>) => Object.entries(facts).flatMap(([fact, holds]) => (holds ? [] : [fact]));
const linkIn = (letter: Letter | undefined) => /\/(?:invite|reset-password)\/([A-Za-z0-9_-]{43})/.exec(letter?.text.replaceAll('=3D', '=') ?? '')?.[1] ?? '';
const works = (view: Promise<unknown>) => view.then(() => true, () => false);

async function countOf({ databases }: Ground, query: ReturnType<typeof sql>, organisationId?: string): Promise<number> {
  const { rows } = organisationId === undefined ? await databases.app.execute(query) : await asTenant(databases.app, { organisationId }, (tx) => tx.execute(query));
  return (rows[0] as { count: number }).count;
}
const isJobDone = async (ground: Ground, marker: string) => (await countOf(ground, sql`select count(*)::int as count from pgboss.job where data::text like ${`%${marker}%`} and state = 'completed'`)) > 0;

/** Every kind of job there is: how one is asked for, and what has to have come of it. */
export const KINDS: Readonly<Record<JobName, Tasks>> = {
  'send-mail': async (ground) => {
    const { databases } = ground;
    const { ctx, organisationId } = await makeTenant(databases, { roles: ['administrator'] });
    return async () => {
      const address = `${crypto.randomUUID()}@people.test`;
      const { invitationId } = await invite({ ctx, input: { email: address, roles: ['technician'] } });
      const { rows } = await asTenant(databases.app, { organisationId }, (tx) => tx.execute<{ id: string }>(sql`select id from mail where to_address = ${address}`));
      const marker = rows[0]?.id ?? '';
      const count = (query: ReturnType<typeof sql>) => countOf(ground, query, organisationId);
      const isNoted = async () => (await count(sql`select count(*)::int as count from mail where id = ${marker} and state = 'sent'`)) === 1;
      return {
        marker,
        address,
        isNoted,
        problems: async (letters) =>
          problemsOf({
            'is noted as sent': await isNoted(),
            'has its own Message-ID': letters.every(({ messageId }) => messageId === `<${marker}@carryover.test>`),
            'holds one link alone': new Set(letters.map(linkIn)).size === 1,
            'holds a link that works': await works(viewInvitation({ visitor: makeVisitor(databases), input: { token: linkIn(letters[0]) } })),
            'was noted in the audit once': (await count(sql`select count(*)::int as count from audit where action = 'mail.invitation' and entity_id = ${invitationId}`)) === 1,
          }),
      };
    };
  },

  'mail-password-reset': async (ground) => {
    const { databases } = ground;
    const tenant = await makeTenant(databases);
    return async () => {
      const { person } = await tenant.addPerson({ password: 'the password of before' });
      await jobs.send(databases.app, 'mail-password-reset', { email: person.email });
      return {
        marker: person.email,
        address: person.email,
        isNoted: () => isJobDone(ground, person.email),
        problems: async (letters) =>
          problemsOf({
            'holds one link alone, under one Message-ID': new Set(letters.map((letter) => linkIn(letter) + letter.messageId)).size === 1,
            'holds a link that works': await works(viewPasswordReset({ visitor: makeVisitor(databases), input: { token: linkIn(letters[0]) } })),
          }),
      };
    };
  },

  'remind-weighing': async (ground) => {
    const { databases } = ground;
    const workshop = await makeWorkshop(databases);
    const { ctx, organisationId } = workshop;
    return async () => {
      const [caseId, catchId] = [await openACase(workshop), newId()];
      await readCautions(ctx, caseId, 'oil-caught');
      await startCatch({ ctx, input: { id: catchId, caseId, checkId: 'oil-caught', remindEveryDays: '2' } });
      // As if its days had gone by.
      await databases.app.execute(sql`update pgboss.job set start_after = now() where data->>'catchId' = ${catchId}`);
      const count = (query: ReturnType<typeof sql>) => countOf(ground, query, organisationId);
      const posted = () => count(sql`select count(*)::int as count from mail where entity_id = ${catchId}`);
      return {
        marker: catchId,
        isNoted: async () => (await posted()) > 0,
        problems: async () =>
          problemsOf({
            'posted one mail': (await posted()) === 1,
            'queued that mail once': (await countOf(ground, sql`select count(*)::int as count from pgboss.job j join mail m on m.id::text = j.data->>'mailId' where m.entity_id = ${catchId}`, organisationId)) === 1,
            'planned the next once': (await countOf(ground, sql`select count(*)::int as count from pgboss.job where data->>'catchId' = ${catchId} and start_after > now() + interval '1 day'`)) === 1,
            'was noted in the audit once': (await count(sql`select count(*)::int as count from audit where action = 'mail.oil-catch' and entity_id = ${catchId}`)) === 1,
          }),
      };
    };
  },

  'remind-watch': async (ground) => {
    const { databases } = ground;
    const workshop = await makeWorkshop(databases);
    const { ctx, organisationId, asOwner } = workshop;
    return async () => {
      const [caseId, watchId] = [await openACase(workshop), newId()];
      await callCause({ ctx, input: { id: newId(), caseId, mainCause: 'rings-worn', sureness: 'sure', whyNotLeading: 'Seen' } });
      await startWatch({ ctx, input: { id: watchId, caseId, begin: Array.from({ length: 4 }, () => ({ answer: 'yes' as const })) } });
      // As if its days had gone by.
      await asOwner((tx) => tx.execute(sql`update watch set started_at = started_at - interval '60 days' where id = ${watchId}`));
      await databases.app.execute(sql`update pgboss.job set start_after = now() where data->>'watchId' = ${watchId}`);
      const count = (query: ReturnType<typeof sql>) => countOf(ground, query, organisationId);
      const told = () => count(sql`select count(*)::int as count from notice where kind = 'watch-due' and case_id = ${caseId}`);
      return {
        marker: watchId,
        isNoted: async () => (await told()) > 0,
        problems: async () =>
          problemsOf({
            'told it once': (await told()) === 1,
            'planned the next once': (await countOf(ground, sql`select count(*)::int as count from pgboss.job where data->>'watchId' = ${watchId} and start_after > now() + interval '1 day'`)) === 1,
            'was noted in the audit once': (await count(sql`select count(*)::int as count from audit where action = 'remind.watch' and entity_id = ${watchId}`)) === 1,
          }),
      };
    };
  },

  'make-thumbnail': async (ground) => {
    const { databases, storage } = ground;
    const { organisationId, personId, asOwner } = await makeTenant(databases);
    const picture = await sharp({ create: { width: 640, height: 480, channels: 3, background: '#c86' } }).jpeg().toBuffer();
    return async () => {
      const photoId = newId();
      const objectKey = `${organisationId}/${photoId}`;
      await storage.storage.put(objectKey, picture, 'image/jpeg');
      await asOwner((tx) => tx.insert(attachment).values({ organisationId, id: photoId, ownerKind: 'case', ownerId: newId(), objectKey, mediaType: 'image/jpeg', bytes: picture.byteLength, state: 'stored', personId }));
      await jobs.send(databases.app, 'make-thumbnail', { organisationId, photoId });
      const keyOf = async () => {
        const { rows } = await asTenant(databases.app, { organisationId }, (tx) => tx.execute<{ key: string | null }>(sql`select thumbnail_key as key from attachment where id = ${photoId}`));
        return rows[0]?.key ?? null;
      };
      return {
        marker: photoId,
        isNoted: async () => (await keyOf()) !== null,
        problems: async () => {
          const key = await keyOf();
          const small = key === null ? undefined : await storage.storage.get(key);
          return problemsOf({
            'is a picture that can be opened': small !== undefined && (await sharp(small).metadata()).width > 0,
            'was noted in the audit once': (await countOf(ground, sql`select count(*)::int as count from audit where action = 'make.thumbnail' and entity_id = ${photoId}`, organisationId)) === 1,
          });
        },
      };
    };
  },

  'make-dossier': async (ground) => {
    const { databases, storage } = ground;
    const workshop = await makeWorkshop(databases, { storage: storage.storage });
    const { ctx, organisationId, personId, asOwner } = workshop;
    const caseId = await openACase(workshop);
    const photoId = newId();
    await storage.storage.put(objectKey(organisationId, photoId), await sharp({ create: { width: 640, height: 480, channels: 3, background: '#c86' } }).jpeg().toBuffer(), 'image/jpeg');
    await asOwner((tx) => tx.insert(attachment).values({ organisationId, id: photoId, ownerKind: 'case', ownerId: caseId, caseId, objectKey: objectKey(organisationId, photoId), mediaType: 'image/jpeg', bytes: 1, width: 640, height: 480, state: 'stored', personId }));
    return async () => {
      const dossierId = newId();
      await makeDossier({ ctx, input: { id: dossierId, caseId, paper: 'a4' } });
      const count = (query: ReturnType<typeof sql>) => countOf(ground, query, organisationId);
      const isNoted = async () => (await count(sql`select count(*)::int as count from dossier where id = ${dossierId} and state = 'made'`)) === 1;
      return {
        marker: dossierId,
        isNoted,
        problems: async () => {
          const pdf = await storage.storage.get(dossierKey(organisationId, dossierId));
          const hash = pdf && createHash('sha256').update(pdf).digest('hex');
          return problemsOf({
            'is noted as made': await isNoted(),
            'is the file whose hash was noted': (await count(sql`select count(*)::int as count from dossier_seal where dossier_id = ${dossierId} and kind = 'pdf' and hash = ${hash ?? ''}`)) === 1,
            'was noted in the audit once': (await count(sql`select count(*)::int as count from audit where action = 'make.dossier-pdf' and entity_id = ${dossierId}`)) === 1,
          });
        },
      };
    };
  },

  'mail-daily-notices': async (ground) => {
    const { databases } = ground;
    const { ctx, organisationId, addPerson } = await makeTenant(databases);
    return async () => {
      const personId = (await addPerson()).person.id;
      for (const key of ['one', 'two']) await asTenant(databases.app, { organisationId }, (tx) => notify(tx, ctx, { organisationId, personId, kind: 'watch-due', caseId: null, key, about: {} }));
      // As if the night had gone by; each notice has asked for the mail.
      await databases.app.execute(sql`delete from pgboss.job where id = (select id from pgboss.job where data->>'personId' = ${personId} limit 1)`);
      await databases.app.execute(sql`update pgboss.job set start_after = now() where data->>'personId' = ${personId}`);
      const count = (query: ReturnType<typeof sql>) => countOf(ground, query, organisationId);
      const posted = () => count(sql`select count(*)::int as count from mail where entity_id = ${personId}`);
      return {
        marker: personId,
        isNoted: async () => (await posted()) > 0,
        problems: async () =>
          problemsOf({
            'posted one mail': (await posted()) === 1,
            'queued that mail once': (await countOf(ground, sql`select count(*)::int as count from pgboss.job j join mail m on m.id::text = j.data->>'mailId' where m.entity_id = ${personId}`, organisationId)) === 1,
            'told all in it': (await count(sql`select count(*)::int as count from notice where person_id = ${personId} and mail_id is null`)) === 0,
            'was noted in the audit once': (await count(sql`select count(*)::int as count from audit where action = 'mail.notice' and entity_id = ${personId}`)) === 1,
          }),
      };
    };
  },

  sweep: async (ground) => {
    const { databases } = ground;
    return async () => {
      const marker = crypto.randomUUID();
      const [old, fresh] = [new Date(Date.now() - 48 * AN_HOUR_MS), new Date(Date.now() - AN_HOUR_MS)];
      await databases.app.insert(attempt).values([{ key: marker, windowStart: old, count: 1 }, { key: marker, windowStart: fresh, count: 1 }]);
      await databases.app.execute(sql`insert into pgboss.job (name, data, policy, retry_limit, retry_delay, expire_in) select name, ${JSON.stringify({ marker })}, policy, retry_limit, retry_delay, expire_seconds * interval '1 second' from pgboss.queue where name = 'sweep'`);
      return {
        marker,
        isNoted: () => isJobDone(ground, marker),
        problems: async () => problemsOf({ 'left what is fresh, and nothing else': (await countOf(ground, sql`select count(*)::int as count from attempt where key = ${marker}`)) === 1 }),
      };
    };
  },
};
