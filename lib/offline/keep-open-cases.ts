import { api } from '@/lib/query/problem';
import { offlineDatabase } from './database';
import { dropOtherPages, hasPage, keepBuiltFiles, keepPages, keepThumbnails } from './keep-pages';
import { askRanker } from './ranker';
import { refreshKit } from './refresh-kit';

/** In the device's own store: which cases it could go on with. */
const KEPT_CASES = 'kept-cases';

interface Listed {
  cases: { id: string; version: number; thumbnails: string[] }[];
}

/** Keeps on this device what it takes to go on with the open cases of whoever is signed in. */
export async function keepOpenCases(): Promise<void> {
  const { cases } = await api<Listed>('/api/v1/device/cases');
  const db = await offlineDatabase();
  const paths = cases.map(({ id }) => `/cases/${id}`);
  const here = /^\/cases\/[0-9a-f-]{36}$/.test(location.pathname) ? [location.pathname] : [];
  await keepBuiltFiles();
  await dropOtherPages([...paths, ...here, '/cases']);
  for (const { id, version, thumbnails } of cases) {
    const held = await db.get('kit', id);
    // The case's own page keeps its kit by itself.
    if (held?.version === version && (await hasPage(`/cases/${id}`))) continue;
    await refreshKit(id);
    await keepPages([`/cases/${id}`]);
    await keepThumbnails(thumbnails);
  }
  await keepPages(['/cases', ...here.filter((path) => !paths.includes(path))]);
  await askRanker({ kind: 'keep' });
  await db.put('device', cases.map(({ id }) => id), KEPT_CASES);
}
