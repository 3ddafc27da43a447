import { execFileSync } from 'node:child_process';
import { cpSync, mkdtempSync, readFileSync, readdirSync, rmSync, unlinkSync, writeFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { sql } from 'drizzle-orm';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabases } from '@/tests/support/context';
import { migrationProblems } from './problems';

const root = fileURLToPath(new URL('../../..', import.meta.url));
const migrations = join(root, 'drizzle');
let copy: string;
beforeEach(() => {
  copy = mkdtempSync(join(tmpdir(), 'carryover-migrations-'));
  cpSync(migrations, copy, { recursive: true });
});
afterEach(() => rmSync(copy, { recursive: true }));

type Journal = { entries: { idx: number; when: number; tag: string; version: string; breakpoints: boolean }[] };
function editJournal(edit: (journal: Journal) => void) {
  const path = join(copy, 'meta', '_journal.json');
  const journal = JSON.parse(readFileSync(path, 'utf8')) as Journal;
  edit(journal);
  writeFileSync(path, JSON.stringify(journal));
}
const last = () => readdirSync(copy).filter((name) => name.endsWith('.sql')).sort().at(-1) ?? '';

describe('the migrations', () => {
  test('hold nothing that the migrator would pass over', () => {
    expect(migrationProblems(migrations)).toEqual([]);
  });

  test('make the tables that the schema describes, no more and no less', () => {
    const config = join(copy, 'drizzle.config.json');
    // drizzle-kit wants a folder relative to where it runs.
    writeFileSync(config, JSON.stringify({ dialect: 'postgresql', schema: './db/schema/index.ts', out: `./${relative(root, copy)}`, casing: 'snake_case' }));
    const said = execFileSync(process.execPath, [join(root, 'node_modules', 'drizzle-kit', 'bin.cjs'), 'generate', `--config=${relative(root, config)}`], { cwd: root, encoding: 'utf8' });
    expect(said).toContain('No schema changes');
  });

  test('bring the job queue that the installed pg-boss expects', async () => {
    const databases = await openTestDatabases();
    const { rows } = await databases.app.execute(sql`select version from pgboss.version`);
    await databases.close();
    const { schema } = createRequire(import.meta.url)('pg-boss/version.json') as { schema: number };
    expect(rows).toEqual([{ version: schema }]);
  });

  test('are all applied, in order', async () => {
    const databases = await openTestDatabases();
    const { rows } = await databases.owner.execute(sql`select count(*)::int as applied from drizzle.__drizzle_migrations`);
    await databases.close();
    expect(rows).toEqual([{ applied: readdirSync(migrations).filter((name) => name.endsWith('.sql')).length }]);
  });
});

describe('is caught:', () => {
  test('a file without an entry in the journal', () => {
    writeFileSync(join(copy, '9999_forgotten.sql'), 'select 1;');
    expect(migrationProblems(copy).join()).toMatch(/9999_forgotten\.sql has no entry/);
  });

  test('an entry without a file', () => {
    unlinkSync(join(copy, last()));
    expect(migrationProblems(copy).join()).toMatch(/has no \.sql file/);
  });

  test('one that is older than the last applied', () => {
    writeFileSync(join(copy, '9999_late.sql'), 'select 1;');
    editJournal(({ entries }) => entries.push({ idx: 99, version: '7', when: (entries.at(-1)?.when ?? 0) - 1, tag: '9999_late', breakpoints: true }));
    expect(migrationProblems(copy).join()).toMatch(/9999_late is older than/);
  });

  test('an edit to one that was committed', () => {
    writeFileSync(join(copy, last()), '-- one more line\n', { flag: 'a' });
    expect(migrationProblems(copy).join()).toMatch(/was edited after it was committed/);
  });

  test('a new one whose checksum is not committed, with the line to add', () => {
    writeFileSync(join(copy, '9999_new.sql'), 'select 1;');
    editJournal(({ entries }) => entries.push({ idx: 99, version: '7', when: Number.MAX_SAFE_INTEGER, tag: '9999_new', breakpoints: true }));
    expect(migrationProblems(copy)).toEqual([expect.stringMatching(/^9999_new\.sql is not in checksums\.txt.* [0-9a-f]{64} {2}9999_new\.sql$/)]);
  });
});
