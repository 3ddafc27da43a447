/** @param {string} text */
const escape = (text) => text.replace(/[&<>"]/g, (character) => `&#${character.charCodeAt(0)};`);

/** @param {string} title @param {string} body */
const page = (title, body) => `<!doctype html>
<html lang="en">
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<title>${escape(title)}</title>
<style>
  body { font: 1rem/1.5 system-ui, sans-serif; max-width: 50rem; margin: 2rem auto; padding: 0 1rem; }
  li { padding: .75rem 0; border-bottom: 1px solid color-mix(in srgb, currentColor 25%, transparent); }
  ul { list-style: none; padding: 0; }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; font: inherit; }
  small { opacity: .75; }
</style>
<h1>${escape(title)}</h1>
${body}
</html>`;

/** Text with its addresses made into links. @param {string} text */
const withLinks = (text) => escape(text).replace(/https?:\/\/[^\s<>"')\]]+/g, (url) => `<a href="${url}">${url}</a>`);

/** @param {import('./mailbox.mjs').Letter[]} letters */
export const listPage = (letters) =>
  page(
    'Mail that Carryover sent',
    letters.length === 0
      ? '<p>Nothing yet. Invitations and password resets appear here; reload the page to look again.</p>'
      : `<ul>${letters
          .map(({ id, subject, to, date }) => `<li><a href="/${escape(id)}">${escape(subject)}</a><br><small>to ${escape(to)}, <time>${escape(date)}</time></small></li>`)
          .join('')}</ul>`,
  );

/** @param {import('./mailbox.mjs').Letter} letter */
export const letterPage = ({ subject, from, to, date, text }) =>
  page(subject, `<p><small>from ${escape(from)}<br>to ${escape(to)}<br><time>${escape(date)}</time></small></p><pre>${withLinks(text)}</pre><p><a href="/">All mail</a></p>`);

export const notFoundPage = () => page('No such mail', '<p><a href="/">All mail</a></p>');
