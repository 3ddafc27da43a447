/** `npm run screenshots`: pictures every page in every state, light and dark, on phone, tablet and desktop. */
import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { chromium, type BrowserContext, type Page } from 'playwright-core';
import { chromiumWanted, findChromium } from './lib/chromium.mjs';
import { runCommand } from './lib/command.mjs';
import { inProject, test } from './lib/paths.mjs';
import { Problem } from './lib/problem.mjs';
import { demoSignIns } from './lib/seed.mjs';
import { indexPage } from './screenshots/index-page';
import { mailedLinks } from './screenshots/mailed-links';
import { startOwnServer } from './screenshots/own-server';
import { SHOTS, type Shot } from './screenshots/pages';
import { findPlaces } from './screenshots/places';
import { take, type Taken } from './screenshots/take';

const HELP = `Pictures every page into .screenshots/, with an index.html.

  npm run screenshots                              a server of its own over a fresh demo
  npm run screenshots -- --url http://127.0.0.1:3000   a server that runs, with the demo's sign-ins;
                                                   states that need a database emptied or broken are left out
  ... --only cases                                 those whose name begins so`;

const FOLDER = inProject('.screenshots');

const { values } = parseArgs({ options: { url: { type: 'string' }, only: { type: 'string', default: '' }, help: { type: 'boolean', default: false } } });

if (values.help) console.log(HELP);
else await runCommand(test.run, async (run) => {
  const executablePath = findChromium();
  if (!executablePath) throw new Problem(chromiumWanted.missing, chromiumWanted.elsewhere);
  const own = values.url ? undefined : await startOwnServer(run);
  const base = values.url ?? own?.url ?? '';
  const browser = await chromium.launch({ executablePath });
  try {
    const contexts = new Map<string, Page>();
    const as = async (who: Shot['as']): Promise<Page> => {
      const held = contexts.get(who) ?? (await enter(await browser.newContext(), base, who));
      contexts.set(who, held);
      return held;
    };
    const go = async (who: Shot['as'], path: string) => {
      const page = await as(who);
      await page.goto(base + path);
      return page;
    };

    const places = { ...(await findPlaces(go)), ...(own && (await mailedLinks(go, await as('nobody'), base, own.letters))) };
    if (!values.only) rmSync(FOLDER, { recursive: true, force: true });
    mkdirSync(FOLDER, { recursive: true });
    const wanted = SHOTS.filter(({ name }) => name.startsWith(values.only));
    const taken: Taken[] = [];
    const skipped: string[] = [];
    for (const stage of ['seeded', 'emptied', 'broken'] as const) {
      const now = wanted.filter((shot) => (shot.stage ?? 'seeded') === stage);
      if (now.length > 0) await own?.become(stage);
      for (const shot of now) {
        const path = stage !== 'seeded' && !own ? undefined : shot.path(places);
        if (path === undefined) {
          skipped.push(shot.name);
          continue;
        }
        run.steps.line(`  ${shot.name}`);
        taken.push(await take(await as(shot.as), base + path, shot, FOLDER));
      }
    }
    writeFileSync(join(FOLDER, 'index.html'), indexPage(taken, skipped));
    run.steps.line(`${taken.length} states pictured in ${FOLDER}/index.html${skipped.length > 0 ? `; not ${skipped.join(', ')}` : ''}`);
    return 0;
  } finally {
    await browser.close();
    own?.removeFiles();
  }
});

/** A page of somebody signed in by the form, or of nobody. */
async function enter(context: BrowserContext, base: string, who: Shot['as']): Promise<Page> {
  // A development server compiles a page when it is first asked for.
  context.setDefaultTimeout(120_000);
  const page = await context.newPage();
  if (who === 'nobody') return page;
  const person = demoSignIns().find(({ role }) => role === who);
  if (!person) throw new Problem(`The demo has no sign-in for "${who}".`, 'db/seed/sign-ins.json lists those it has.');
  await page.goto(`${base}/sign-in`);
  await page.getByLabel(/e-?mail/i).fill(person.email);
  await page.getByLabel(/password/i).fill(person.password);
  await page.getByRole('button', { name: /sign in/i }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  return page;
}
