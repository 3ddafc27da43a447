/**
 * What the worker's job takes of memory for the dossier of a case with 60 photos (A) against one with 6 (B): each in a
 * process of its own, which begins afresh. The photos are as a phone makes them, 12 million pixels each.
 */
import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import sharp from 'sharp';
import { connect } from '@/db/connect';
import { attachment } from '@/db/schema';
import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import { makeDossier } from '@/lib/services/dossier/make';
import { objectKey } from '@/lib/services/photo/object-key';
import { openACase } from '@/tests/integration/cases/support';
import { openTestStorage } from '@/tests/support/storage';
import { makeTenant } from '@/tests/support/tenant';
import { inProject, root, test } from '../lib/paths.mjs';
import { processKeeper } from '../lib/processes.mjs';
import { stepPrinter } from '../lib/steps.mjs';
import { copyTemplate, makeTemplate, startThrowAwayCluster } from '../lib/throw-away-cluster.mjs';

const [MANY, FEW] = [60, 6];
const [WIDTH, HEIGHT] = [4000, 3000];

const run = promisify(execFile);

export async function dossierMemory() {
  const processes = processKeeper(test.run);
  const cluster = await startThrowAwayCluster({ processes, steps: stepPrinter() });
  const database = await copyTemplate(cluster, await makeTemplate(cluster));
  const [app, owner] = [connect(database.appUrl), connect(database.ownerUrl)];
  const { storage, settings, close: closeStorage } = await openTestStorage();
  const tenant = await makeTenant({ app: app.db, owner: owner.db, appUrl: database.appUrl, ownerUrl: database.ownerUrl, close: async () => undefined }, { storage, rulebook: defaultRulebook });
  const { ctx, organisationId, personId } = tenant;
  const picture = await sharp({ create: { width: WIDTH, height: HEIGHT, channels: 3, background: '#888', noise: { type: 'gaussian', mean: 128, sigma: 12 } } }).jpeg({ quality: 85 }).toBuffer();

  async function dossierWith(photos: number): Promise<string> {
    const [caseId, dossierId] = [await openACase(tenant), newId()];
    for (let i = 0; i < photos; i++) {
      const id = newId();
      await storage.put(objectKey(organisationId, id), picture, 'image/jpeg');
      await tenant.asOwner((tx) => tx.insert(attachment).values({ organisationId, id, ownerKind: 'case', ownerId: caseId, caseId, objectKey: objectKey(organisationId, id), mediaType: 'image/jpeg', bytes: picture.byteLength, width: WIDTH, height: HEIGHT, state: 'stored', personId }));
    }
    await makeDossier({ ctx, input: { id: dossierId, caseId, paper: 'a4' } });
    return dossierId;
  }

  /** Peak of a process that makes the PDF of a new dossier, in MiB. */
  async function peakOf(dossierId: string): Promise<number> {
    const env = { ...process.env, DATABASE_URL: database.appUrl, S3_ENDPOINT: settings.endpoint, S3_BUCKET: settings.bucket, S3_ACCESS_KEY: settings.accessKey, S3_SECRET_KEY: settings.secretKey };
    const { stdout } = await run(process.execPath, ['--import', 'tsx', inProject('scripts', 'bench', 'dossier-child.ts'), organisationId, dossierId], { cwd: root, env });
    return Number(stdout.trim()) / 1024;
  }

  return {
    about: `${MANY} and ${FEW} photos of ${(picture.byteLength / 1024 / 1024).toFixed(1)} MiB`,
    many: async () => peakOf(await dossierWith(MANY)),
    few: async () => peakOf(await dossierWith(FEW)),
    async close() {
      await Promise.all([app.close(), owner.close(), closeStorage()]);
      await processes.stopAll();
    },
  };
}
