import { sql } from 'drizzle-orm';
import { parse as readExif } from 'exifr';
import sharp from 'sharp';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { fileResponse } from '@/lib/auth/file-response';
import { newId } from '@/lib/ids';
import { MOST_PHOTO_BYTES } from '@/lib/schemas/photo-limits';
import type { Ctx } from '@/lib/services/context';
import { addPhoto } from '@/lib/services/photo/add';
import { photoArrived } from '@/lib/services/photo/arrived';
import { hidePhoto } from '@/lib/services/photo/hide';
import { listPhotos } from '@/lib/services/photo/list';
import { makeThumbnail } from '@/lib/services/photo/make-thumbnail';
import { markPhoto } from '@/lib/services/photo/mark';
import { arrivalKey, objectKey, thumbnailKey } from '@/lib/services/photo/object-key';
import { readPicture, readThumbnail, type PhotoFile } from '@/lib/services/photo/read';
import { readCaseState } from '@/lib/services/case/read';
import { makeWorkshop, openACase } from '@/tests/integration/cases/support';
import { openTestDatabases, type TestDatabases } from '@/tests/support/context';
import { refusalOf } from '@/tests/support/refusal';
import { openTestStorage, type TestStorage } from '@/tests/support/storage';
import type { Tenant } from '@/tests/support/tenant';
import { announce, jpegWithPlace, noise, send, smallJpeg, upload } from './support';

let databases: TestDatabases;
let stand: TestStorage;
let house: Tenant;
let ctx: Ctx;
let caseId: string;
let jpeg: Buffer;

beforeAll(async () => {
  [databases, stand] = await Promise.all([openTestDatabases(), openTestStorage()]);
  house = await makeWorkshop(databases, { storage: stand.storage });
  ({ ctx } = house);
  caseId = await openACase(house);
  jpeg = await smallJpeg();
});
afterAll(() => Promise.all([databases?.close(), stand?.close()]));

const kept = (id: string) => stand.storage.get(objectKey(house.organisationId, id));
const arrival = (id: string) => stand.storage.head(arrivalKey(house.organisationId, id));
const jobsFor = async (id: string) => {
  const { rows } = await databases.app.execute(sql`select data from pgboss.job where name = 'make-thumbnail' and data->>'photoId' = ${id}`);
  return rows.map(({ data }) => data as { organisationId: string; photoId: string });
};
const bytesOf = async ({ open }: PhotoFile) => Buffer.from(await new Response((await open()) as BodyInit).arrayBuffer());
const listed = async (of = caseId) => (await listPhotos({ ctx, input: { caseId: of } })).photos;

describe('from announcing to the list', () => {
  test('is stored as it was sent, listed with its size and a job for its thumbnail, and others hear of it', async () => {
    const before = await readCaseState({ ctx, input: { caseId } });
    const { id, state } = await send(ctx, jpeg, { caseId, checkId: 'onset', description: 'Black at the fitting' });
    expect(state).toBe('stored');
    expect(Buffer.from((await kept(id)) ?? [])).toEqual(jpeg);
    expect(await arrival(id)).toBeUndefined();
    expect((await listed()).find((photo) => photo.id === id)).toMatchObject({
      caseId, checkId: 'onset', width: 400, height: 300, description: 'Black at the fitting', strokes: [], hidden: null, person: ctx.person.name,
    });
    expect(await jobsFor(id)).toEqual([{ organisationId: house.organisationId, photoId: id }]);
    expect((await readCaseState({ ctx, input: { caseId } })).version).toBe(before.version + 1);
  });

  test('the time is the device’s, put right, and never in the future', async () => {
    const takenAt = new Date(ctx.now().getTime() - 3_600_000);
    const at = async (input: { takenAt: string; clockOffsetMs: number }) => {
      const standing = await addPhoto({ ctx, input: { id: newId(), caseId, mediaType: 'image/jpeg', bytes: jpeg.byteLength, ...input } });
      await upload(standing, jpeg);
      await photoArrived({ ctx, input: { photoId: standing.id } });
      return Date.parse((await listed()).find(({ id }) => id === standing.id)?.takenAt ?? '');
    };
    expect(await at({ takenAt: takenAt.toISOString(), clockOffsetMs: 600_000 })).toBe(takenAt.getTime() + 600_000);
    expect(await at({ takenAt: '2090-01-01T00:00:00Z', clockOffsetMs: 0 })).toBeLessThanOrEqual(Date.now());
  });

  test('forty at once are all stored, once each', async () => {
    const many = await openACase(house);
    const states = await Promise.all(Array.from({ length: 40 }, () => send(ctx, jpeg, { caseId: many })));
    expect(new Set(states.map(({ state }) => state))).toEqual(new Set(['stored']));
    expect(new Set((await listed(many)).map(({ id }) => id)).size).toBe(40);
  }, 60_000);
});

describe('repeats', () => {
  test('announced again before it is there: the same row, a permission that works', async () => {
    const id = newId();
    await announce(ctx, jpeg, { caseId, id });
    const again = await announce(ctx, jpeg, { caseId, id });
    expect(again.state).toBe('awaited');
    await upload(again, jpeg);
    expect((await photoArrived({ ctx, input: { photoId: id } })).state).toBe('stored');
    expect(await announce(ctx, jpeg, { caseId, id })).toEqual({ id, state: 'stored', refusal: null, upload: null });
  });

  test('said twice that it arrived, one after the other and at once: stored once, one job', async () => {
    const standing = await announce(ctx, jpeg, { caseId });
    await upload(standing, jpeg);
    const say = () => photoArrived({ ctx, input: { photoId: standing.id } });
    expect((await Promise.all([say(), say(), say()])).map(({ state }) => state)).toEqual(['stored', 'stored', 'stored']);
    expect((await say()).state).toBe('stored');
    expect(await jobsFor(standing.id)).toHaveLength(1);
  });

  test('said before it did: asked to upload, and nothing is lost', async () => {
    const standing = await announce(ctx, jpeg, { caseId });
    expect((await refusalOf(photoArrived({ ctx, input: { photoId: standing.id } }))).code).toBe('conflict');
    await upload(standing, jpeg);
    expect((await photoArrived({ ctx, input: { photoId: standing.id } })).state).toBe('stored');
  });

  test('a part of it is no refusal: it is asked for again', async () => {
    const standing = await announce(ctx, jpeg, { caseId });
    await upload(standing, jpeg.subarray(0, 1000));
    expect((await refusalOf(photoArrived({ ctx, input: { photoId: standing.id } }))).message).toMatch(/whole/);
    await upload(standing, jpeg);
    expect((await photoArrived({ ctx, input: { photoId: standing.id } })).state).toBe('stored');
  });

  test('what is uploaded after it was looked at never shows', async () => {
    const standing = await announce(ctx, jpeg, { caseId });
    await upload(standing, jpeg);
    await photoArrived({ ctx, input: { photoId: standing.id } });
    await upload(standing, await jpegWithPlace());
    expect(Buffer.from((await kept(standing.id)) ?? [])).toEqual(jpeg);
  });

  test('an id of another case or of another file is a mistake', async () => {
    const { id } = await announce(ctx, jpeg, { caseId });
    expect((await refusalOf(announce(ctx, jpeg.subarray(1), { caseId, id }))).code).toBe('conflict');
    expect((await refusalOf(announce(ctx, jpeg, { caseId: await openACase(house), id }))).code).toBe('conflict');
  });
});

describe('the place where it was taken', () => {
  test('is gone from what is kept, and the picture stands upright', async () => {
    const original = await jpegWithPlace();
    expect(await readExif(original, { gps: true })).toMatchObject({ latitude: expect.closeTo(51.5, 1) });
    const { id, state } = await send(ctx, original, { caseId });
    expect(state).toBe('stored');
    const stored = Buffer.from((await kept(id)) ?? []);
    expect(await readExif(stored, { tiff: true, exif: true, gps: true, xmp: true, iptc: true, icc: false })).toBeUndefined();
    expect(stored.includes('Exif')).toBe(false);
    expect(stored.byteLength).not.toBe(original.byteLength);
    expect(await announce(ctx, original, { caseId, id })).toMatchObject({ state: 'stored', upload: null });
    // It lay on its side.
    expect((await listed()).find((photo) => photo.id === id)).toMatchObject({ width: 300, height: 400 });
  });

  test('also in a WebP and a PNG, and behind the end of a JPEG', async () => {
    const exif = { IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 0/1' } };
    for (const [bytes, mediaType] of [
      [await noise(60, 40).webp().withExif(exif).toBuffer(), 'image/webp'],
      [await noise(60, 40).png().withExif(exif).toBuffer(), 'image/png'],
      [Buffer.concat([jpeg, await jpegWithPlace(60, 40)]), 'image/jpeg'],
    ] as const) {
      const { id, state } = await send(ctx, bytes, { caseId, mediaType });
      expect([mediaType, state]).toEqual([mediaType, 'stored']);
      const stored = Buffer.from((await kept(id)) ?? []);
      for (const mark of ['Exif', 'eXIf', 'EXIF']) expect([mediaType, stored.includes(mark)]).toEqual([mediaType, false]);
      expect(await sharp(stored).metadata()).not.toHaveProperty('exif');
    }
  });
});

describe('what is refused', () => {
  const refused = async (bytes: Uint8Array, announced: Partial<Parameters<typeof announce>[2]> = {}) => {
    const standing = await send(ctx, bytes, { caseId, ...announced });
    expect(standing.state).toBe('refused');
    expect([await kept(standing.id), await arrival(standing.id)]).toEqual([undefined, undefined]);
    expect((await listed()).some(({ id }) => id === standing.id)).toBe(false);
    expect((await refusalOf(readPicture({ ctx, input: { photoId: standing.id } }))).code).toBe('not-found');
    return standing.refusal;
  };

  test('what is no picture', async () => {
    expect(await refused(Buffer.from('%PDF-1.7 '.repeat(100)))).toMatch(/no picture/);
  });
  test('a drawing, which could hold a script', async () => {
    expect(await refused(Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"><script>1</script></svg>'))).toMatch(/no picture/);
  });
  test('a picture of another type than was announced', async () => {
    expect(await refused(await noise(60, 40).png().toBuffer())).toMatch(/announced as image\/jpeg and is image\/png/);
  });
  test('a damaged picture', async () => {
    expect(await refused(Buffer.concat([jpeg.subarray(0, jpeg.byteLength / 2), Buffer.alloc(200)]))).toMatch(/damaged/);
  });
  test('a bomb: a small file of very many pixels', async () => {
    const bomb = await sharp({ create: { width: 16_000, height: 16_000, channels: 3, background: '#000' }, limitInputPixels: false }).png({ compressionLevel: 9 }).toBuffer();
    expect(bomb.byteLength).toBeLessThan(MOST_PHOTO_BYTES);
    expect(await refused(bomb, { mediaType: 'image/png' })).toMatch(/million pixels/);
  }, 60_000);
  test('twelve megabytes, when they are announced and when they come all the same', async () => {
    const large = await noise(4300, 3200).jpeg({ quality: 95 }).toBuffer();
    expect(large.byteLength).toBeGreaterThan(12e6);
    expect((await refusalOf(announce(ctx, large, { caseId }))).fields.bytes).toMatch(/4 MB/);
    // The stand-in keeps no limit, so that ours is seen to hold.
    const standing = await announce(ctx, jpeg, { caseId });
    await upload(standing, large);
    expect((await photoArrived({ ctx, input: { photoId: standing.id } })).refusal).toMatch(/more than 4 MB/);
    expect(await arrival(standing.id)).toBeUndefined();
  }, 60_000);
  test('a type that is none of ours, and a check that is not in the rulebook', async () => {
    const ask = (more: object) => refusalOf(addPhoto({ ctx, input: { id: newId(), caseId, mediaType: 'image/jpeg', bytes: 9, takenAt: new Date().toISOString(), ...more } }));
    expect((await ask({ mediaType: 'image/svg+xml' })).fields).toHaveProperty('mediaType');
    expect((await ask({ checkId: 'no-such-check' })).fields).toHaveProperty('checkId');
  });
});

describe('the thumbnail', () => {
  test('is there at once, and the same when the worker has made it, once or twice', async () => {
    const { id } = await send(ctx, jpeg, { caseId });
    const read = () => readThumbnail({ ctx, input: { photoId: id } });
    const before = await bytesOf(await read());
    expect(await stand.storage.head(thumbnailKey(house.organisationId, id))).toBeUndefined();
    const work = () => makeThumbnail({ db: databases.app, storage: stand.storage, now: ctx.now }, { organisationId: house.organisationId, photoId: id });
    await Promise.all([work(), work()]);
    await work();
    expect(await stand.storage.head(thumbnailKey(house.organisationId, id))).toEqual({ bytes: before.byteLength, mediaType: 'image/webp' });
    expect(await bytesOf(await read())).toEqual(before);
    expect(await sharp(before).metadata()).toMatchObject({ format: 'webp', width: 320, height: 240 });
  });

  test('is passed on to be shown and kept by this browser alone, and never to be run', async () => {
    const { id } = await send(ctx, jpeg, { caseId });
    const { headers } = await fileResponse(await readThumbnail({ ctx, input: { photoId: id } }));
    expect(Object.fromEntries(headers)).toMatchObject({
      'content-type': 'image/webp',
      'cache-control': 'private, max-age=31536000, immutable',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "default-src 'none'; sandbox",
    });
  });

  test('of a photo that was refused is not made', async () => {
    const { id } = await send(ctx, Buffer.from('nothing'), { caseId });
    await makeThumbnail({ db: databases.app, storage: stand.storage, now: ctx.now }, { organisationId: house.organisationId, photoId: id });
    expect((await refusalOf(readThumbnail({ ctx, input: { photoId: id } }))).code).toBe('not-found');
  });
});

describe('marks and hiding', () => {
  const strokes = [{ points: [[0.1, 0.2], [0.5, 0.5]] as [number, number][] }];

  test('what one draws, everybody sees; the picture stays as it is', async () => {
    const { id } = await send(ctx, jpeg, { caseId });
    const colleague = await house.addPerson({ roles: ['engineer'] });
    const { version } = await readCaseState({ ctx, input: { caseId } });
    await markPhoto({ ctx, input: { photoId: id, strokes, description: 'Here' } });
    await markPhoto({ ctx, input: { photoId: id, strokes, description: 'Here' } });
    const seen = (await listPhotos({ ctx: colleague, input: { caseId } })).photos.find((photo) => photo.id === id);
    expect(seen).toMatchObject({ strokes, description: 'Here' });
    expect(Buffer.from((await kept(id)) ?? [])).toEqual(jpeg);
    expect((await readCaseState({ ctx, input: { caseId } })).version).toBe(version + 1);
  });

  test('lines off the picture, and more than a hand draws, are refused', async () => {
    const { id } = await send(ctx, jpeg, { caseId });
    const mark = (points: [number, number][]) => refusalOf(markPhoto({ ctx, input: { photoId: id, strokes: [{ points }, { points }], description: '' } }));
    expect((await mark([[1.2, 0]])).code).toBe('invalid');
    expect((await mark(Array.from({ length: 4000 }, () => [0.5, 0.5]))).fields).toHaveProperty('strokes');
  });

  test('hidden with a reason, shown again, nothing deleted', async () => {
    const { id } = await send(ctx, jpeg, { caseId });
    const hide = (hidden: boolean, reason: string) => hidePhoto({ ctx, input: { photoId: id, hidden, reason } });
    const hiddenNow = async () => (await listed()).find((photo) => photo.id === id)?.hidden;
    expect((await refusalOf(hide(true, ' '))).fields).toHaveProperty('reason');
    await hide(true, 'Wrong truck');
    await hide(true, 'Wrong truck');
    expect(await hiddenNow()).toMatchObject({ reason: 'Wrong truck', person: ctx.person.name });
    await hide(false, 'It was the right one');
    expect(await hiddenNow()).toBeNull();
    expect(await kept(id)).toBeDefined();
  });
});

describe('who may', () => {
  test('another organisation finds nothing, whatever it tries', async () => {
    const { id } = await send(ctx, jpeg, { caseId });
    const { ctx: theirs } = await makeWorkshop(databases, { storage: stand.storage });
    const photo = { ctx: theirs, input: { photoId: id } };
    for (const attempt of [
      () => announce(theirs, jpeg, { caseId }),
      () => listPhotos({ ctx: theirs, input: { caseId } }),
      () => photoArrived(photo),
      () => readPicture(photo),
      () => readThumbnail(photo),
      () => markPhoto({ ctx: theirs, input: { photoId: id, strokes: [], description: '' } }),
      () => hidePhoto({ ctx: theirs, input: { photoId: id, hidden: true, reason: 'Ours now' } }),
    ]) expect((await refusalOf(attempt())).code).toBe('not-found');
  });

  test('who works on no cases neither sees nor adds', async () => {
    const trainer = await house.addPerson({ roles: ['trainer'] });
    for (const attempt of [() => listPhotos({ ctx: trainer, input: { caseId } }), () => announce(trainer, jpeg, { caseId })]) {
      expect((await refusalOf(attempt())).code).toBe('forbidden');
    }
  });
});
