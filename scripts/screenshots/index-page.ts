import type { Taken } from './take';

const escape = (text: string) => text.replace(/[&<>"]/g, (character) => `&#${character.charCodeAt(0)};`);

/** One page with all pictures, a row a shot, so that a look down a column shows what doesn't belong. */
export function indexPage(taken: readonly Taken[], skipped: readonly string[]): string {
  const rows = taken.map(
    ({ name, path, as, files }) => `<section id="${escape(name)}"><h2>${escape(name)} <small>${escape(path)}, ${escape(as)}</small></h2><div>${files
      .map(({ file, caption, width }) => `<figure><a href="${escape(file)}"><img loading="lazy" src="${escape(file)}" alt="${escape(`${name}, ${caption}`)}" style="width:${Math.round(width / 4)}px"></a><figcaption>${escape(caption)}</figcaption></figure>`)
      .join('')}</div></section>`,
  );
  return `<!doctype html>
<html lang="en">
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Carryover, every page</title>
<style>
  body { font: 1rem/1.4 system-ui, sans-serif; margin: 1.5rem; background: #888; color: #000; }
  div { display: flex; gap: 1rem; align-items: flex-start; overflow-x: auto; }
  figure { margin: 0; } img { display: block; } small { font-weight: 400; }
</style>
<h1>Every page, ${taken.length} states</h1>
${skipped.length > 0 ? `<p>Not pictured here: ${escape(skipped.join(', '))}.</p>` : ''}
${rows.join('\n')}
</html>
`;
}
