import { GROUPS } from '@/lib/bench/groups';
import { api } from '@/lib/query/problem';
import { offlineDatabase } from './database';
import { dropOtherPages, hasPage, keepBuiltFiles, keepPages, keepThumbnails } from './keep-pages';
import { isOwned, keepForOwner } from './owner';
import { askRanker } from './ranker';
import { refreshKit } from './refresh-kit';

/** The bench is the same for everybody, and fetched once; a visit fetches it anew. */
const BENCH = ['/bench', ...GROUPS.flatMap(({ sums, others = [] }) => [...sums, ...others.map(({ id }) => id)].map((id) => `/bench/${id}`))];

/** In the device's own store: which cases it could go on with. */
const KEPT_CASES = 'kept-cases';

interface Listed {
  cases: { id: string; version: number; thumbnails: string[] }[];
}

/** Keeps on this device what it takes to go on with the open cases of whoever is signed in; nothing, if they sign out meanwhile. */
export async function keepOpenCases(): Promise<void> {
  const { cases } = await api<Listed>('/api/v1/device/cases');
  const db = await offlineDatabase();
  const paths = cases.map(({ id }) => `/cases/${id}`);
  const here = /^\/cases\/[0-9a-f-]{36}$/.test(location.pathname) ? [location.pathname] : [];
  await keepBuiltFiles();
  // A sum that is open for a case is a page of its own.
  const sumHere = location.pathname.startsWith('/bench/') ? [location.pathname + location.search] : [];
  await dropOtherPages([...paths, ...here, ...sumHere, '/cases', ...BENCH]);
  for (const { id, version, thumbnails } of cases) {
    if (!(await isOwned())) return;
    const held = await db.get('kit', id);
    // The case's own page keeps its kit by itself.
    if (held?.version === version && (await hasPage(`/cases/${id}`))) continue;
    await refreshKit(id);
    await keepPages([`/cases/${id}`]);
    await keepThumbnails(thumbnails);
  }
  await keepPages(['/cases', ...here.filter((path) => !paths.includes(path))]);
  await askRanker({ kind: 'keep' });
  await keepForOwner('device', cases.map(({ id }) => id), KEPT_CASES);
  for (const path of BENCH) if ((await isOwned()) && !(await hasPage(path))) await keepPages([path]);
}
