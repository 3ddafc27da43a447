/**
 * Who may import whom, as lint rules: the table of DEVELOPERS.md, enforced. Each row names a folder and what it must
 * not reach; types are allowed where a row says so, since they leave no code behind.
 */
const DATABASE = ['@/db', '@/db/**', 'drizzle-orm', 'drizzle-orm/*', 'pg'];
const FRAMEWORK = ['react', 'react-dom', 'react/*', 'next', 'next/*', 'next-auth', 'next-auth/*', 'server-only'];
const NODE = ['node:*', 'fs', 'fs/*', 'path', 'crypto'];
const APPLICATION = ['@/app/*', '@/components/*', '@/worker/*', '@/scripts/*', '@/tests/*'];
const OTHER_LIBRARIES = (...own) => [
  ...['auth', 'services', 'mail', 'storage', 'jobs', 'query', 'schemas', 'errors', 'env', 'ids', 'diagnose', 'units']
    .filter((name) => !own.includes(name))
    .flatMap((name) => [`@/lib/${name}`, `@/lib/${name}/*`]),
];

/** @type {{ folder: string, except?: string[], never: string[], typesAllowed?: boolean, because: string }[]} */
const ROWS = [
  { folder: 'app/**', never: DATABASE, because: 'Routes reach the database through a service.' },
  {
    folder: 'components/**',
    never: [...DATABASE, '@/lib/services', '@/lib/services/**', '@/lib/auth', '@/lib/auth/**', '@/lib/openapi/answers/**', '@/lib/openapi/document'],
    because: 'Components get their data as properties.',
    typesAllowed: true,
  },
  {
    folder: 'lib/openapi/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, '@/lib/services/**', '@/lib/auth/session'],
    because: 'The document is made from schemas alone.',
    typesAllowed: true,
  },
  {
    folder: 'db/**',
    except: ['db/seed/**'],
    never: [...FRAMEWORK.filter((name) => name !== 'server-only'), ...APPLICATION, ...OTHER_LIBRARIES('errors', 'ids', 'env')],
    because: 'The database layer knows nothing of what is built on it.',
    typesAllowed: true,
  },
  {
    folder: 'lib/diagnose/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('diagnose'), 'pino'],
    because: 'The ranking core is pure: its inputs are its parameters.',
  },
  {
    folder: 'lib/diagnose/**',
    except: ['lib/diagnose/record-run.ts', 'lib/diagnose/engine/**'],
    never: ['json-rules-engine'],
    because: 'The compiled half runs in a browser without the engine.',
    adds: true,
  },
  {
    folder: 'lib/case/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, '@/lib/diagnose', '@/lib/diagnose/record-run', '@/lib/services/**', '@/lib/auth/**'],
    because: 'What a case looks like is worked out on the server and on the device alike.',
    typesAllowed: true,
  },
  {
    folder: 'lib/units/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('units')],
    because: 'Units are pure arithmetic on text.',
  },
  {
    folder: 'lib/air-and-oil/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('units'), 'zod'],
    because: 'A sum is worked out alike on a page, on the server and without a connection.',
  },
  {
    folder: 'lib/reliability/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES(), 'zod'],
    because: 'A statistic is worked out of what is handed to it.',
  },
  {
    folder: 'lib/limits/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('units'), 'zod'],
    because: 'A limit judges a value, handed to it.',
  },
  {
    folder: 'lib/baseline/**',
    // Of the schemas only how a day is written.
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('units', 'schemas'), '@/lib/schemas', 'zod'],
    because: 'What is usual for a unit is worked out alike on a page, on the server and without a connection.',
  },
  {
    folder: 'lib/search/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES(), 'zod'],
    because: 'What was typed is read, and what was found is marked, the same wherever it is shown.',
  },
  {
    folder: 'lib/dossier/**',
    never: [...FRAMEWORK, ...DATABASE, 'node:fs', 'fs', 'fs/*', 'path', ...APPLICATION, ...OTHER_LIBRARIES('schemas', 'diagnose', 'units'), '@/lib/pdf'],
    because: 'What a dossier says is written from parts, handed to it: the same parts always give the same words.',
  },
  {
    folder: 'lib/pdf/**',
    never: [...DATABASE, ...APPLICATION, 'next', 'next/*', 'next-auth', ...OTHER_LIBRARIES('schemas')],
    because: 'A PDF is set from what a document says.',
  },
  {
    folder: 'lib/stopwatch/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES(), 'zod'],
    because: 'A stopwatch is times of the clock, handed to it.',
  },
  {
    folder: 'lib/break-in/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES(), 'zod'],
    because: 'A break-in run is times of the clock, handed to it.',
  },
  {
    folder: 'lib/fitting/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES(), 'zod'],
    because: 'What is asked of a fitting is data, and what its answers make of the record follows from them.',
  },
  {
    folder: 'lib/watch/**',
    // Of the schemas only how a day is written.
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('diagnose', 'schemas'), '@/lib/schemas', '@/lib/diagnose', 'zod'],
    because: 'What a watch asks for and proves is worked out of what is handed to it.',
    typesAllowed: true,
  },
  {
    folder: 'lib/rulebook/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('diagnose', 'units'), '@/lib/diagnose/record-run', 'zod', 'json-rules-engine'],
    because: 'What a rulebook says, does and learns is worked out of what is handed to it, in a browser too.',
    typesAllowed: true,
  },
  {
    folder: 'lib/import/**',
    // Of the schemas only the words that are chosen from, and which measures a form asks for.
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('schemas', 'units'), '@/lib/schemas', 'zod'],
    because: 'A file is read into records, and judged, by what is handed to it.',
  },
  {
    folder: 'lib/gate/**',
    never: [...FRAMEWORK, ...DATABASE, ...NODE, ...APPLICATION, ...OTHER_LIBRARIES('diagnose'), '@/lib/diagnose', '@/lib/diagnose/record-run', 'zod'],
    because: 'What a gate asks and says follows from the ranking, handed to it.',
    typesAllowed: true,
  },
  {
    folder: 'lib/schemas/**',
    never: [...FRAMEWORK, ...DATABASE, ...APPLICATION, '@/lib/services', '@/lib/services/**', '@/lib/auth/session'],
    because: 'Schemas are shared by form, action, route and service.',
  },
  {
    folder: 'lib/services/**',
    never: [...FRAMEWORK, ...APPLICATION, '@/db', '@/lib/auth/session', '@/lib/auth/action', '@/lib/auth/route', '@/lib/auth/page'],
    because: 'A service is handed its context; it knows no framework.',
  },
  { folder: 'worker/**', never: [...FRAMEWORK, '@/app/*', '@/components/*'], because: 'A job calls a service.' },
  { folder: 'tests/**', except: ['tests/e2e/**'], never: ['@/db', '@/db/index'], because: 'Tests open their own connection.' },
];

/** "a" means exactly a, "a/*" all below it: the lint rule's own globs would take "a" for both. */
const regex = (names) => `^(?:${names.map((name) => name.replace(/[.$]/g, '\\$&').replace(/([:/])\*+$/, '$1.+')).join('|')})$`;

const patternsFor = (row) => [{ regex: regex(row.never), message: row.because, allowTypeImports: row.typesAllowed ?? false }];

// A later block replaces a rule's options, so that a row that adds to another's carries both.
const joined = ROWS.filter((row) => !row.adds).map((row) => ({
  files: [`${row.folder}/*.{ts,tsx}`, `${row.folder.replace('/**', '')}/*.{ts,tsx}`],
  ignores: row.except ?? [],
  rules: {
    '@typescript-eslint/no-restricted-imports': ['error', { patterns: patternsFor(row) }],
  },
}));

const withAdditions = ROWS.filter((row) => row.adds).map((row) => {
  const base = ROWS.find((other) => other.folder === row.folder && !other.adds);
  return {
    files: [`${row.folder}/*.ts`, `${row.folder.replace('/**', '')}/*.ts`],
    ignores: row.except ?? [],
    rules: {
      '@typescript-eslint/no-restricted-imports': ['error', { patterns: [...patternsFor(base), ...patternsFor(row)] }],
    },
  };
});

export const boundaries = [...joined, ...withAdditions];
