import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

interface Entry {
  idx: number;
  when: number;
  tag: string;
}

const readChecksums = (folder: string) =>
  new Map(
    (existsSync(join(folder, 'checksums.txt')) ? readFileSync(join(folder, 'checksums.txt'), 'utf8') : '')
      .split('\n')
      .filter(Boolean)
      .map((line) => {
        const [checksum = '', name = ''] = line.split(/\s+/);
        return [name, checksum];
      }),
  );

/** What the migrator would let pass in silence, a sentence each, with the way out. */
export function migrationProblems(folder: string): string[] {
  const { entries } = JSON.parse(readFileSync(join(folder, 'meta', '_journal.json'), 'utf8')) as { entries: Entry[] };
  const files = readdirSync(folder).filter((name) => name.endsWith('.sql')).sort();
  const checksums = readChecksums(folder);
  const problems: string[] = [];

  for (const name of files) {
    if (!entries.some(({ tag }) => `${tag}.sql` === name)) {
      problems.push(`${name} has no entry in meta/_journal.json, so that it is never applied. Make it with "npm run db:generate -- --custom --name=…".`);
    }
    const checksum = createHash('sha256').update(readFileSync(join(folder, name))).digest('hex');
    const committed = checksums.get(name);
    if (committed === undefined) problems.push(`${name} is not in checksums.txt. When it is final, add this line: ${checksum}  ${name}`);
    else if (committed !== checksum) problems.push(`${name} was edited after it was committed; databases that have it won't get the edit. Undo the edit and write a new migration.`);
  }
  for (const name of checksums.keys()) if (!files.includes(name)) problems.push(`${name} is in checksums.txt and is gone. Databases that have it can't be told from those that don't.`);

  entries.forEach(({ tag, when }, i) => {
    const before = entries[i - 1];
    if (!files.includes(`${tag}.sql`)) problems.push(`${tag} is in the journal and has no .sql file.`);
    if (before && when <= before.when) problems.push(`${tag} is older than ${before.tag}, which is before it, so that databases that have the latter skip it. Generate it anew.`);
  });
  return problems;
}
