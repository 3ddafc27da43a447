import { readFileSync } from 'node:fs';

/**
 * Reads NAME=value lines; `#` begins a comment line and quotes round a value are taken off. Our own because it runs
 * before any package is installed and Node reads such files itself only from 20.12 on.
 * @param {string} text
 * @returns {Record<string, string>}
 */
export function parseDotenv(text) {
  /** @type {Record<string, string>} */
  const found = {};
  for (const line of text.split(/\r?\n/)) {
    const match = /^\s*(?:export\s+)?([A-Za-z_][A-Za-z0-9_]*)\s*=\s*(.*?)\s*$/.exec(line);
    if (!match) continue;
    const [, name, value] = match;
    const quoted = /^(["'])(.*)\1$/.exec(value);
    found[name] = quoted ? quoted[2] : value.replace(/\s+#.*$/, '');
  }
  return found;
}

/**
 * The environment with the file's values under it: what is set outside wins. An empty value counts as not set.
 * @param {string} path
 * @param {Record<string, string | undefined>} environment
 * @returns {Record<string, string>}
 */
export function withDotenv(path, environment) {
  let text = '';
  try {
    text = readFileSync(path, 'utf8');
  } catch (error) {
    if (error.code !== 'ENOENT') throw error;
  }
  const merged = { ...parseDotenv(text), ...environment };
  return Object.fromEntries(Object.entries(merged).filter(([, value]) => value !== undefined && value !== ''));
}
