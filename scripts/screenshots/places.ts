import type { Page } from 'playwright-core';

/** What the pictures are made of: found by walking through the application, so that any database will do. */
export interface Places {
  openCase?: string;
  calledCase?: string;
  /** The address of a case at a past moment. */
  pastMoment?: string;
  /** The address of a dossier. */
  dossier?: string;
  unit?: string;
  /** The address of a fit. */
  fit?: string;
  model?: string;
  limit?: string;
  person?: string;
  site?: string;
  /** Addresses of mailed links; only a server of our own shows its mail. */
  invitation?: string;
  reset?: string;
}

const ID = '[0-9a-f]{8}-[0-9a-f-]{27}';

export type Go = (as: 'technician' | 'administrator', path: string) => Promise<Page>;

export async function findPlaces(go: Go): Promise<Places> {
  const openCase = await firstId(await go('technician', '/cases?status=open'), '/cases/');
  const calledCase = (await firstId(await go('technician', '/cases?status=called'), '/cases/')) ?? (await firstId(await go('technician', '/cases?status=closed'), '/cases/'));
  const pastMoment = openCase && (await pastOf(await go('technician', `/cases/${openCase}`), openCase));
  const unit = await firstId(await go('technician', '/units'), '/units/');
  const fit = unit && (await firstHref(await go('technician', `/units/${unit}`), new RegExp(`/units/${ID}/fits/${ID}$`)));
  const model = await firstId(await go('technician', '/models'), '/models/');
  const limit = await firstId(await go('technician', '/settings/limits'), '/settings/limits/');
  const person = await firstId(await go('administrator', '/settings/people'), '/settings/people/');
  const site = await firstId(await go('administrator', '/settings/sites'), '/settings/sites/');
  const dossier = await dossierOf(go, calledCase);
  return { openCase, calledCase, pastMoment, dossier, unit, fit, model, limit, person, site };
}

/** The first dossier of a case that was called. */
async function dossierOf(go: Go, caseId: string | undefined): Promise<string | undefined> {
  return caseId && (await firstHref(await go('technician', `/cases/${caseId}/dossier`), new RegExp(`/cases/${ID}/dossier/${ID}$`)));
}

/** The second of the moments that the API tells of: something was asked, and much was still to come. */
async function pastOf(page: Page, caseId: string): Promise<string | undefined> {
  const at = await page.evaluate(async (id) => {
    const { findings } = (await (await fetch(`/api/v1/cases/${id}`)).json()) as { findings: { receivedAt: string; source: string }[] };
    const asked = findings.filter(({ source }) => source === 'asked').map(({ receivedAt }) => receivedAt).sort();
    return asked[Math.floor(asked.length / 2)];
  }, caseId);
  return at && `/cases/${caseId}?at=${encodeURIComponent(at)}`;
}

async function firstId(page: Page, prefix: string): Promise<string | undefined> {
  return (await firstHref(page, new RegExp(`^${prefix}${ID}$`)))?.slice(prefix.length);
}

async function firstHref(page: Page, pattern: RegExp): Promise<string | undefined> {
  // Loaded isn't there yet: the page may still show its outline, which has no heading.
  await page.locator('h1').waitFor();
  const hrefs = await page.locator('main a[href]').evaluateAll((links) => links.map((link) => link.getAttribute('href') ?? ''));
  return hrefs.find((href) => pattern.test(href));
}
