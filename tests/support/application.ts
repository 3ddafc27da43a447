import { openTestStorage } from './storage';
import { Browser } from './next-request';
import { openTestDatabases, type TestDatabases } from './context';

/** Points the application at this file's own database and storage, as its environment would. Before anything of it runs. */
export async function openApplication({ url = 'http://carryover.test' } = {}): Promise<TestDatabases> {
  const [databases, stand] = await Promise.all([openTestDatabases(), openTestStorage()]);
  Object.assign(process.env, {
    DATABASE_URL: databases.appUrl,
    NEXTAUTH_URL: url,
    NEXTAUTH_SECRET: 'a secret for tests alone, of no use anywhere',
    SMTP_URL: 'smtp://127.0.0.1:9',
    MAIL_FROM: 'Carryover <carryover@carryover.test>',
    S3_ENDPOINT: stand.settings.endpoint,
    S3_BUCKET: stand.settings.bucket,
    S3_ACCESS_KEY: stand.settings.accessKey,
    S3_SECRET_KEY: stand.settings.secretKey,
    LOG_LEVEL: 'silent',
  });
  return {
    ...databases,
    async close() {
      await globalThis.carryoverChanges?.close();
      await globalThis.carryoverConnection?.close();
      await Promise.all([databases.close(), stand.close()]);
    },
  };
}

/** Signs in through the form's own action. */
export async function signInAs(email: string, password: string): Promise<Browser> {
  const browser = new Browser();
  const { enter } = await import('@/lib/auth/enter');
  const { getVisitor } = await import('@/lib/auth/visitor');
  await browser.act('/sign-in', async () => enter({ visitor: await getVisitor(), input: { email, password } }));
  return browser;
}
