import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { parse as readExif } from 'exifr';
import type { Browser, BrowserContext, Page } from 'playwright-core';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { PhotoList } from '@/lib/schemas/photo';
import { objectKey, thumbnailKey } from '@/lib/services/photo/object-key';
import { createStorage, type Storage } from '@/lib/storage';
import { jpegWithPlace, noise, smallJpeg } from '@/tests/integration/photos/support';
import { openCaseOn } from './support/case-desk';
import { expectNoAxeViolations } from './support/axe';
import { DESKTOP, launchBrowser, PHONE } from './support/browser';
import { startServer, type TestServer } from './support/server';
import { signIn } from './support/sign-in';

const SENT_WITHIN_MS = 60_000;
/** On two cores that other tests share, with pictures that no coder can make small. */
const FORTY_SENT_WITHIN_MS = 200_000;

const file = (name: string, buffer: Buffer, mimeType = 'image/jpeg') => ({ name, mimeType, buffer });
const strip = (page: Page) => page.locator('section[aria-labelledby=photos]');
const tiles = (page: Page) => strip(page).locator('ul > li > button');
const choose = (page: Page, files: ReturnType<typeof file>[] | string[]) => strip(page).getByLabel(/^Choose photos/).setInputFiles(files);
const listed = (page: Page, caseId: string): Promise<PhotoList['photos']> =>
  page.evaluate(async (id) => ((await (await fetch(`/api/v1/cases/${id}/photos`)).json()) as { photos: never }).photos, caseId);

const organisationOf = (page: Page, caseId: string): Promise<string> =>
  page.evaluate(async (id) => ((await (await fetch(`/api/v1/cases/${id}/kit`)).json()) as { organisationId: string }).organisationId, caseId);

async function untilListed(page: Page, caseId: string, count: number, withinMs = SENT_WITHIN_MS): Promise<PhotoList['photos']> {
  for (const deadline = Date.now() + withinMs; Date.now() < deadline; await page.waitForTimeout(200)) {
    const photos = await listed(page, caseId);
    if (photos.length >= count) return photos;
  }
  throw new Error(`${(await listed(page, caseId)).length} photos arrived within ${withinMs / 1000} s; expected ${count}. The strip says: ${await strip(page).innerText()}`);
}

/** Nothing of the strip says that it waits or is being sent, and every picture of it is there. */
const settled = (page: Page) =>
  page.waitForFunction(() => {
    const section = document.querySelector('section[aria-labelledby=photos]');
    const pictures = [...(section?.querySelectorAll('img') ?? [])];
    return !/Waits|Being sent/.test(section?.textContent ?? '') && pictures.length > 0 && pictures.every((img) => img.src.endsWith('/thumbnail'));
  }, undefined, { timeout: SENT_WITHIN_MS });

describe('photos in the bay', () => {
  let server: TestServer;
  let browser: Browser;
  let storage: Storage;
  let context: BrowserContext;
  let page: Page;
  let organisationId: string;
  const complaints: string[] = [];

  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(), launchBrowser()]);
    const { S3_ENDPOINT, S3_REGION, S3_BUCKET, S3_ACCESS_KEY, S3_SECRET_KEY } = server.storage;
    storage = createStorage({ endpoint: S3_ENDPOINT, region: S3_REGION, bucket: S3_BUCKET, accessKey: S3_ACCESS_KEY, secretKey: S3_SECRET_KEY });
    // What a service worker passes on, a test can't cut.
    context = await browser.newContext({ ...PHONE, serviceWorkers: 'block' });
    page = await context.newPage();
    page.on('pageerror', (error) => complaints.push(error.message));
    await signIn(page, server.url, 'technician');
    organisationId = await organisationOf(page, await openCaseOn(page));
  });
  afterAll(() => Promise.all([browser?.close(), server?.stop()]));

  async function openACase(): Promise<string> {
    const caseId = await openCaseOn(page);
    await page.goto(`${server.url}/cases/${caseId}`);
    await strip(page).waitFor();
    return caseId;
  }

  it('a photo of twelve megabytes goes small, upright and without the place where it was taken', async () => {
    const caseId = await openACase();
    const original = await jpegWithPlace(4300, 3200, 97);
    expect(original.byteLength).toBeGreaterThan(12e6);
    await strip(page).getByLabel(/^Take a photo/).setInputFiles(file('IMG_0001.jpg', original));
    const [photo] = await untilListed(page, caseId, 1);
    expect(photo).toMatchObject({ width: 1524, height: 2048 });
    const kept = Buffer.from((await storage.get(objectKey(organisationId, photo?.id ?? ''))) ?? []);
    expect(kept.byteLength).toBeLessThan(4e6);
    expect(await readExif(kept, { tiff: true, exif: true, gps: true, xmp: true, iptc: true, icc: false })).toBeUndefined();
    expect(await sharp(kept).metadata()).toMatchObject({ width: 1524, height: 2048, format: 'jpeg' });

    await settled(page);
    for (const deadline = Date.now() + SENT_WITHIN_MS; Date.now() < deadline; await page.waitForTimeout(200)) {
      if (await storage.head(thumbnailKey(organisationId, photo?.id ?? ''))) break;
    }
    const thumbnail = await storage.get(thumbnailKey(organisationId, photo?.id ?? ''));
    expect(await sharp(thumbnail).metadata()).toMatchObject({ format: 'webp', height: 320 });
  });

  it('what is no picture is left out with a sentence, what has the wrong name is not, and the others go on', async () => {
    const caseId = await openACase();
    await choose(page, [
      file('notes.jpg', Buffer.from('no picture')),
      file('IMG_0002.HEIC', Buffer.from('\0\0\0\x18ftypheic\0\0\0\0'), 'image/heic'),
      file('really-a-picture.txt', await noise(80, 60).png().toBuffer(), 'text/plain'),
      file('last.jpg', await smallJpeg()),
    ]);
    await untilListed(page, caseId, 2);
    const words = await strip(page).innerText();
    expect(words).toContain('2 files were left out');
    expect(words).toMatch(/“notes\.jpg” can’t be read as a picture/);
    expect(words).toMatch(/“IMG_0002\.HEIC” is an HEIC picture.*Set the camera to JPEG/);
    await expectNoAxeViolations(page, 'section[aria-labelledby=photos]');
  });

  it('forty at once all arrive, each sent once by one of two tabs, and the page goes on answering meanwhile', async () => {
    const caseId = await openACase();
    const second = await context.newPage();
    await second.goto(page.url());
    await strip(second).waitFor();
    // Behind another tab, timers run slow.
    await page.bringToFront();
    const announced: string[] = [];
    context.on('request', (request) => request.method() === 'POST' && request.url().endsWith(`/cases/${caseId}/photos`) && announced.push(request.url()));
    const one = await smallJpeg(1600, 1200);
    const folder = mkdtempSync(join(tmpdir(), 'carryover-photos-'));
    const paths = Array.from({ length: 40 }, (_, i) => join(folder, `IMG_${i}.jpg`));
    for (const path of paths) writeFileSync(path, one);
    await choose(page, paths);
    await page.getByLabel('Show decibans').check();
    expect(announced.length).toBeLessThan(40);
    expect(new Set((await untilListed(page, caseId, 40, FORTY_SENT_WITHIN_MS)).map(({ id }) => id)).size).toBe(40);
    await settled(page);
    expect(await tiles(page).count()).toBe(40);
    expect(announced).toHaveLength(40);
    await settled(second);
    expect(await tiles(second).count()).toBe(40);
    await second.close();
    rmSync(folder, { recursive: true });
  }, FORTY_SENT_WITHIN_MS + 60_000);

  it('taken after the session has ended, a photo waits until somebody has signed in again', async () => {
    const caseId = await openACase();
    const cookies = await context.cookies();
    await context.clearCookies();
    await choose(page, [file('later.jpg', await smallJpeg())]);
    await strip(page).getByText('Waits').waitFor();
    await context.addCookies(cookies);
    await untilListed(page, caseId, 1);
    await settled(page);
  });

  it('an upload that is cut waits, survives a reload, takes what is drawn along, and is seen by somebody else', async () => {
    const caseId = await openACase();
    const cut = `${server.storage.S3_ENDPOINT}/**`;
    await context.route(cut, (route) => route.abort());
    await choose(page, [file('cut.jpg', await smallJpeg(1200, 900))]);
    await strip(page).getByText('Waits').waitFor();
    await page.reload();
    await strip(page).getByText(/Waits|Being sent/).waitFor();
    expect(await listed(page, caseId)).toEqual([]);

    await tiles(page).first().click();
    const dialog = page.getByRole('dialog');
    const canvas = dialog.getByRole('application');
    await canvas.locator('img').waitFor();
    await expectNoAxeViolations(page, 'dialog');
    const box = await canvas.boundingBox();
    if (!box) throw new Error('The picture is not on the screen');
    await page.mouse.move(box.x + box.width * 0.25, box.y + box.height * 0.5);
    await page.mouse.down();
    await page.mouse.move(box.x + box.width * 0.5, box.y + box.height * 0.25, { steps: 8 });
    await page.mouse.up();
    // Without a pointer: a ring.
    await canvas.focus();
    for (const key of ['ArrowRight', 'ArrowRight', 'ArrowDown', '+', 'Enter']) await page.keyboard.press(key);
    await dialog.getByLabel('What it shows').fill('Oil at the fitting');
    await dialog.getByRole('button', { name: 'Save', exact: true }).click();
    await dialog.waitFor({ state: 'detached' });

    await context.unroute(cut);
    const [photo] = await untilListed(page, caseId, 1);
    expect(photo).toMatchObject({ width: 1200, height: 900 });
    await settled(page);

    const other = await (await browser.newContext(DESKTOP)).newPage();
    await signIn(other, server.url, 'engineer');
    await other.goto(`${server.url}/cases/${caseId}`);
    await strip(other).getByRole('img', { name: /^Oil at the fitting/ }).waitFor();
    expect(await tiles(other).first().locator('svg g').count()).toBe(2);
    const [marked] = await listed(other, caseId);
    expect(marked?.strokes[0]?.points[0]).toEqual([expect.closeTo(0.25, 1), expect.closeTo(0.5, 1)]);

    // And the other way round, on the page as it stands.
    await tiles(other).first().click();
    await other.getByRole('dialog').getByRole('button', { name: 'Clear all lines' }).click();
    await other.getByRole('dialog').getByRole('button', { name: 'Save', exact: true }).click();
    await other.getByRole('dialog').waitFor({ state: 'detached' });
    await tiles(page).first().locator('svg').waitFor({ state: 'detached', timeout: 10_000 });
    await other.context().close();
  });

  it('a hidden photo goes out of sight with its reason, and comes back', async () => {
    await openACase();
    await choose(page, [file('hide.jpg', await smallJpeg())]);
    await settled(page);
    const say = async (why: RegExp, button: string) => {
      const dialog = page.getByRole('dialog');
      if (!(await dialog.getByLabel(why).isVisible())) await dialog.getByText('Hide this photo').click();
      await dialog.getByLabel(why).fill('Wrong truck');
      await dialog.getByRole('button', { name: button }).click();
      await dialog.waitFor({ state: 'detached' });
    };
    await tiles(page).first().click();
    await say(/Why hide it/, 'Hide it');
    await strip(page).getByText('1 hidden').click();
    await tiles(page).first().click();
    await page.getByText('“Wrong truck”').waitFor();
    await say(/Why show it again/, 'Show it again');
    await strip(page).getByText('1 hidden').waitFor({ state: 'detached' });
    expect(await tiles(page).count()).toBe(1);
  });

  it('never complained in the console', () => {
    expect(complaints).toEqual([]);
  });
});
