import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import ApiGroupPage from '@/app/(public)/api/docs/[group]/page';
import ApiDocsPage from '@/app/(public)/api/docs/page';
import { readableApi } from '@/app/(public)/api/docs/readable-api';
import { DescribedAnswers } from '@/tests/support/described';

const pageOf = async (group: string) => renderToStaticMarkup(await ApiGroupPage({ params: Promise.resolve({ group }) }));
const fragmentsOf = (html: string) => [...html.matchAll(/href="#([\w-]+)"/g)].map(([, id]) => id ?? '');

test('the pages show every operation of the document', async () => {
  const { document } = await DescribedAnswers.fromRoute();
  const asked = Object.entries(document.paths).flatMap(([path, methods]) => Object.keys(methods ?? {}).map((method) => `${method.toUpperCase()} ${path}`));
  expect(readableApi().groups.flatMap(({ operations }) => operations.map(({ method, path }) => `${method} ${path}`)).sort()).toEqual(asked.sort());
});

test('what is linked on a page is on it', async () => {
  const index = renderToStaticMarkup(ApiDocsPage());
  for (const { id } of readableApi().groups) {
    const html = await pageOf(id);
    expect([id, fragmentsOf(html).filter((fragment) => !html.includes(`id="${fragment}"`))]).toEqual([id, []]);
    const linked = [...index.matchAll(new RegExp(`href="/api/docs/${id}#([\\w-]+)"`, 'g'))].map(([, fragment]) => fragment ?? '');
    expect([id, linked.filter((fragment) => !html.includes(`id="${fragment}"`))]).toEqual([id, []]);
  }
  expect(index).toContain('id="refusals"');
});
