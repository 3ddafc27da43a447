import { createHash } from 'node:crypto';
import { sql } from 'drizzle-orm';
import sharp from 'sharp';
import { extractText, getDocumentProxy } from 'unpdf';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newId } from '@/lib/ids';
import { createMailer, type Mailer } from '@/lib/mail';
import { callCause } from '@/lib/services/case/call';
import { readCaseState } from '@/lib/services/case/read';
import { recordFinding } from '@/lib/services/case/record-finding';
import type { Ctx } from '@/lib/services/context';
import { adoptLimit } from '@/lib/services/limit/adopt';
import { makeDossierAgain } from '@/lib/services/dossier/again';
import { makeDossier } from '@/lib/services/dossier/make';
import { makeDossierPdf } from '@/lib/services/dossier/make-pdf';
import { downloadDossier, listDossiers, readDossier } from '@/lib/services/dossier/read';
import { sendDossier, sendDossierAgain } from '@/lib/services/dossier/send';
import { verifyDossier } from '@/lib/services/dossier/verify';
import { sendMail, type Post } from '@/lib/services/mail/send';
import { acknowledgeRepair } from '@/lib/services/repair/acknowledge';
import { chooseRepair } from '@/lib/services/repair/choose';
import { readRepairPlan } from '@/lib/services/repair/read-plan';
import { markStep } from '@/lib/services/repair/work';
import { give, makeWorkshop, openACase, readCautions, yes } from '@/tests/integration/cases/support';
import { PostOffice } from '@/tests/integration/mail/post-office';
import { send as sendPhoto } from '@/tests/integration/photos/support';
import { makeClock } from '@/tests/support/clock';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { openTestStorage, type TestStorage } from '@/tests/support/storage';
import { makeTenant, makeVisitor, type Tenant } from '@/tests/support/tenant';

const clock = makeClock();
let databases: TestDatabases;
let storage: TestStorage;
let office: PostOffice;
let mailer: Mailer;
let post: Post;
let workshop: Tenant;

beforeAll(async () => {
  [databases, storage, office] = await Promise.all([openTestDatabases(), openTestStorage(), new PostOffice().open()]);
  workshop = await makeWorkshop(databases, { now: clock.now, storage: storage.storage });
  const engineer = await workshop.addPerson({ roles: ['engineer'] });
  await adoptLimit({ ctx: engineer, input: { id: newId(), checkId: 'build-up-time', least: '', most: '25 s', source: 'Our own rule 7' } });
  mailer = createMailer(office.url, 'Carryover <carryover@carryover.test>', { connectionMs: 500, greetingMs: 500, totalMs: 2_000 });
  post = { db: databases.app, mailer, now: clock.now, baseUrl: 'https://carryover.test', secret: 'a secret for tests alone', storage: storage.storage };
});
afterAll(async () => {
  mailer.close();
  await Promise.all([office.close(), storage.close()]);
  await databases.close();
});

const LAST = { isLast: true };
const picture = () => sharp({ create: { width: 1600, height: 1200, channels: 3, background: '#c86' } }).jpeg().toBuffer();

/** A case with all that a dossier shows: a value out of its limit, an answer, a photo, a call and half a repair. */
async function wholeCase() {
  const { ctx } = workshop;
  const engineer = await workshop.addPerson({ roles: ['engineer'] });
  const caseId = await openACase(workshop, { odometer: '410,000 mi' });
  clock.forward(1_000);
  await give(ctx, { caseId, checkId: 'build-up-time', answer: { kind: 'measured', value: '48', error: '1', sureness: 'sure' } });
  clock.forward(1_000);
  await give(engineer, { caseId, checkId: 'external-drain', answer: { kind: 'state', state: 'falls-freely', sureness: 'sure' } });
  const photo = await sendPhoto(ctx, await picture(), { caseId, description: 'The gasket face ≤ 1 mm of sealant' });
  const { causes } = await readCaseState({ ctx, input: { caseId } });
  await callCause({ ctx, input: { id: newId(), caseId, mainCause: causes[0]?.causeId ?? '', sureness: 'fairly-sure' } });
  const [first] = (await readRepairPlan({ ctx, input: { caseId } })).remedies;
  const repairId = newId();
  await chooseRepair({ ctx, input: { id: repairId, caseId, remedyId: first?.remedyId ?? '' } });
  const cautions = (first?.toRead ?? []).map((cautionId) => ({ id: newId(), cautionId }));
  if (cautions.length > 0) await acknowledgeRepair({ ctx, input: { caseId, remedyId: first?.remedyId ?? '', cautions } });
  await markStep({ ctx, input: { id: newId(), caseId, repairId, step: 0, mark: 'done', value: '30 lb·ft' } });
  return { ctx, engineer, caseId, photoId: photo.id, cause: causes[0], remedy: first };
}

async function made(input: Partial<Parameters<typeof makeDossier>[0]['input']> = {}) {
  const whole = await wholeCase();
  const id = newId();
  const { reference } = await makeDossier({ ctx: whole.ctx, input: { id, caseId: whole.caseId, paper: 'a4', ...input } });
  const of = { caseId: whole.caseId, dossierId: id };
  return { ...whole, of, id, reference, makePdf: () => makeDossierPdf(post, { organisationId: workshop.organisationId, dossierId: id }, LAST) };
}

async function pdfOf(ctx: Ctx, of: { caseId: string; dossierId: string }) {
  const body = await (await downloadDossier({ ctx, input: of })).open();
  return new Uint8Array(await new Response(body as BodyInit).arrayBuffer());
}

async function textOf(pdf: Uint8Array) {
  const { text, totalPages } = await extractText(await getDocumentProxy(pdf.slice()), { mergePages: true });
  return { text: text.replace(/\s+/g, ' '), totalPages };
}

describe('a dossier that is made', () => {
  it('comes out as a PDF with figures, limits, sources, the ranking of the call, the repair and its hash', async () => {
    const { ctx, of, reference, makePdf, cause, remedy } = await made();
    expect(reference).toMatch(/^D-2026-\d{5}$/);
    await makePdf();
    const dossier = await readDossier({ ctx, input: of });
    expect(dossier).toMatchObject({ state: 'made', isUnchanged: true, reference });
    const pdf = await pdfOf(ctx, of);
    expect(createHash('sha256').update(pdf).digest('hex')).toBe(dossier.pdfHash);
    const { text, totalPages } = await textOf(pdf);
    const plain = (words: string) => words.replace(/\s+/g, ' ');
    for (const words of [reference, dossier.contentHash, `page 1 of ${totalPages}`, '48 s ± 1 s', 'at most 25 s', 'Our own rule 7', 'Out of limit', '410,000 mi', 'The gasket face <= 1 mm of sealant', remedy?.steps[0] ?? 'no step', '30 lb·ft', 'fairly sure', 'The ranking is advice']) {
      expect(text).toContain(plain(words));
    }
    const levels = dossier.content.sections.find(({ id }) => id === 'ranking')?.blocks.find((block) => block.kind === 'levels');
    expect(levels?.kind === 'levels' && levels.levels[0]?.p).toBe(cause?.p);
    expect(text).toContain(levels?.kind === 'levels' ? `${levels.levels[0]?.printed} ${levels.levels[0]?.name}` : 'no levels');
  });

  it('gives what was seen at a repair among the reasons, as the ranking has it', async () => {
    const { ctx } = workshop;
    const caseId = await openACase(workshop);
    clock.forward(1_000);
    await readCautions(ctx, caseId, 'sealant-in-drain');
    await recordFinding({ ctx, input: { id: newId(), caseId, checkId: 'sealant-in-drain', stage: { kind: 'after-remedy', remedy: 1 }, answer: yes, deviceAt: ctx.now().toISOString() } });
    const dossierId = newId();
    await makeDossier({ ctx, input: { id: dossierId, caseId, paper: 'a4' } });
    const levels = (await readDossier({ ctx, input: { caseId, dossierId } })).content.sections.find(({ id }) => id === 'ranking')?.blocks.find((block) => block.kind === 'levels');
    expect(levels?.kind === 'levels' && levels.levels[0]?.reasons).toContainEqual(expect.stringMatching(/^Sealant in the (oil )?drain/));
  });

  it('is the same file when it is made again', async () => {
    const { ctx, of, makePdf } = await made({ paper: 'letter' });
    await makePdf();
    const first = await pdfOf(ctx, of);
    await workshop.asOwner((tx) => tx.execute(sql`update dossier set state = 'waiting', object_key = null, pdf_hash = null where id = ${of.dossierId}`));
    clock.forward(60_000);
    await makePdf();
    expect(Buffer.from(await pdfOf(ctx, of)).equals(Buffer.from(first))).toBe(true);
  });

  it('stays as it was, whatever is found afterwards', async () => {
    const { ctx, of, caseId } = await made();
    const before = await readDossier({ ctx, input: of });
    await sendPhoto(ctx, await picture(), { caseId, description: 'Later' });
    expect((await readDossier({ ctx, input: of })).content).toEqual(before.content);
    // The application has no right to change what it says.
    await expect(databases.app.execute(sql`update dossier set content = '{}'`)).rejects.toMatchObject({ cause: { code: '42501' } });
  });

  it('leaves out what its maker chose, says so, and numbers people instead of naming them', async () => {
    const whole = await wholeCase();
    const { ctx, engineer, caseId, photoId } = whole;
    const id = newId();
    await makeDossier({ ctx, input: { id, caseId, paper: 'a4', leaveOut: ['ranking'], leaveOutPhotos: [photoId], withholdNames: 'on', withholdFleet: 'on' } });
    const { content } = await readDossier({ ctx, input: { caseId, dossierId: id } });
    expect(content.sections.map((section) => section.id)).not.toContain('ranking');
    expect(content.leftOut).toEqual(['Ranking of causes', '1 of 1 photos', 'Names of people', 'Fleet and unit']);
    const json = JSON.stringify(content);
    for (const word of [ctx.person.name, engineer.person.name, ctx.organisation.name, photoId]) expect(json).not.toContain(word);
    expect(json).toContain('Technician 1');
  });

  it('is made once when it is asked for twice, and its numbers have no gaps', async () => {
    const { ctx, caseId } = await wholeCase();
    const id = newId();
    const first = await makeDossier({ ctx, input: { id, caseId, paper: 'a4' } });
    expect(await makeDossier({ ctx, input: { id, caseId, paper: 'a4' } })).toEqual(first);
    const second = await makeDossier({ ctx, input: { id: newId(), caseId, paper: 'letter' } });
    expect(Number(second.reference.slice(-5))).toBe(Number(first.reference.slice(-5)) + 1);
    expect((await listDossiers({ ctx, input: { caseId } })).dossiers.map(({ reference }) => reference)).toEqual([second.reference, first.reference]);
  });

  it('says that its PDF failed, and is asked for again', async () => {
    const { ctx, of, makePdf, photoId } = await made();
    const key = `${workshop.organisationId}/photos/${photoId}`;
    const kept = await storage.storage.get(key);
    await storage.storage.remove(key);
    await expect(makePdf()).rejects.toThrow('is gone');
    expect(await readDossier({ ctx, input: of })).toMatchObject({ state: 'failed', error: expect.stringContaining('could not be made') });
    await expect(downloadDossier({ ctx, input: of })).rejects.toMatchObject({ code: 'conflict' });
    await storage.storage.put(key, kept ?? new Uint8Array(), 'image/jpeg');
    await makeDossierAgain({ ctx, input: of });
    expect(await readDossier({ ctx, input: of })).toMatchObject({ state: 'waiting', error: null });
    await makePdf();
    expect(await readDossier({ ctx, input: of })).toMatchObject({ state: 'made', error: null });
  });

  it('is nobody’s of another organisation, nor of another case', async () => {
    const { of } = await made();
    const stranger = await makeTenant(databases, { storage: storage.storage });
    const elsewhere = await openACase(workshop);
    for (const [ctx, caseId] of [[stranger.ctx, of.caseId], [workshop.ctx, elsewhere]] as const) {
      const input = { caseId, dossierId: of.dossierId };
      const tries = [
        () => readDossier({ ctx, input }),
        () => downloadDossier({ ctx, input }),
        () => makeDossierAgain({ ctx, input }),
        () => sendDossier({ ctx, input: { ...input, id: newId(), to: 'a@people.test', words: '' } }),
      ];
      for (const attempt of tries) await expect(attempt()).rejects.toMatchObject({ code: 'not-found' });
    }
    await expect(makeDossier({ ctx: stranger.ctx, input: { id: newId(), caseId: of.caseId, paper: 'a4' } })).rejects.toMatchObject({ code: 'not-found' });
    const trainer = await workshop.addPerson({ roles: ['trainer'] });
    await expect(listDossiers({ ctx: trainer, input: { caseId: of.caseId } })).rejects.toMatchObject({ code: 'forbidden' });
  });
});

describe('a dossier that is sent', () => {
  const mailOf = async (sendingId: string) => {
    const { rows } = await workshop.asOwner((tx) => tx.execute<{ id: string }>(sql`select mail_id as id from dossier_sending where id = ${sendingId}`));
    return { organisationId: workshop.organisationId, mailId: rows[0]?.id ?? '' };
  };

  it('goes out with its PDF, its reference and where to verify it, once', async () => {
    const { ctx, of, reference, makePdf } = await made();
    const input = { ...of, id: newId(), to: `${newId()}@people.test`, words: 'As we said on the phone.' };
    await expect(sendDossier({ ctx, input })).rejects.toMatchObject({ code: 'conflict' });
    await makePdf();
    await sendDossier({ ctx, input });
    await sendDossier({ ctx, input });
    await sendMail(post, await mailOf(input.id), { isLast: false });
    const [letter, ...more] = office.takenBy(input.to);
    expect(more).toEqual([]);
    const words = letter?.text ?? '';
    for (const part of ['As we said on the phone.', reference, 'https://carryover.test/verify', `filename=${reference}.pdf`]) expect(words).toContain(part);
    const [, encoded = ''] = /filename=D-[\d-]+\.pdf\r?\n(?:[^\r\n]+\r?\n)*\r?\n([A-Za-z0-9+/=\r\n]+)/.exec(words) ?? [];
    const { pdfHash } = await readDossier({ ctx, input: of });
    expect(createHash('sha256').update(Buffer.from(encoded, 'base64')).digest('hex')).toBe(pdfHash);
    const [row] = (await listDossiers({ ctx, input: { caseId: of.caseId } })).dossiers;
    expect(row?.sendings).toEqual([expect.objectContaining({ to: input.to, state: 'sent', error: null, sentBy: ctx.person.name })]);
  });

  it('says why a server would not have it, and is tried again', async () => {
    const { ctx, of, makePdf } = await made();
    await makePdf();
    const input = { ...of, id: newId(), to: `${newId()}@people.test`, words: '' };
    await sendDossier({ ctx, input });
    const mail = await mailOf(input.id);
    office.towards.set(input.to, 'refuses the address');
    await expect(sendMail(post, mail, { isLast: false })).rejects.toThrow();
    const [refused] = (await readDossier({ ctx, input: of })).sendings;
    expect(refused).toMatchObject({ state: 'given-up', error: expect.stringMatching(/\w/) });
    office.towards.delete(input.to);
    await sendDossierAgain({ ctx, input: { ...of, sendingId: input.id } });
    expect((await readDossier({ ctx, input: of })).sendings[0]).toMatchObject({ state: 'waiting' });
    await sendMail(post, mail, { isLast: false });
    expect(office.takenBy(input.to)).toHaveLength(1);
  });
});

describe('whether a dossier is unchanged', () => {
  it('is told to anybody who has its reference and a hash of it, and nothing else is', async () => {
    const { ctx, of, reference, makePdf } = await made();
    await makePdf();
    const { contentHash, pdfHash, madeAt } = await readDossier({ ctx, input: of });
    const visitor = makeVisitor(databases, { now: clock.now });
    const ask = (hash: string, ref = reference) => verifyDossier({ visitor, input: { reference: ref, hash } });
    expect(await ask(contentHash)).toEqual({ found: 'content', madeAt });
    expect(await ask(pdfHash ?? '')).toEqual({ found: 'pdf', madeAt });
    const changed = await pdfOf(ctx, of);
    changed[changed.length - 10] = (changed[changed.length - 10] ?? 0) ^ 1;
    expect(await ask(createHash('sha256').update(changed).digest('hex'))).toEqual({ found: null });
    expect(await ask(contentHash, 'D-2025-00001')).toEqual({ found: null });
    await expect(ask('not a hash')).rejects.toMatchObject({ fields: { hash: expect.any(String) } });
    await expect(ask(contentHash, 'something')).rejects.toMatchObject({ fields: { reference: expect.any(String) } });
  });

  it('is not asked without end', async () => {
    const visitor = makeVisitor(databases, { now: clock.now });
    const ask = () => verifyDossier({ visitor, input: { reference: 'D-2026-00001', hash: '0'.repeat(64) } });
    for (let i = 0; i < 60; i++) await ask();
    await expect(ask()).rejects.toMatchObject({ code: 'too-many' });
  });
});
