import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';

/** Each row breaks one line of the layout table in DEVELOPERS.md on purpose; lint must object. */
const BROKEN: [file: string, source: string][] = [
  ['app/page.tsx', "import { eq } from 'drizzle-orm'; export default eq;"],
  ['app/(signed-in)/cases/page.tsx', "import { database } from '@/db'; export default database;"],
  ['components/ui/Button.tsx', "import { openCase } from '@/lib/services/case/open'; export default openCase;"],
  ['components/ui/Button.tsx', "import { getContext } from '@/lib/auth/session'; export default getContext;"],
  ['db/queries/unit.ts', "import { openCase } from '@/lib/services/case/open'; export default openCase;"],
  ['lib/diagnose/rank.ts', "import { useState } from 'react'; export default useState;"],
  ['lib/diagnose/rank.ts', "import { Engine } from 'json-rules-engine'; export default Engine;"],
  ['lib/diagnose/rank.ts', "import { parseQuantity } from '@/lib/units'; export default parseQuantity;"],
  ['lib/diagnose/record-run.ts', "import { readFileSync } from 'node:fs'; export default readFileSync;"],
  ['lib/units/parse.ts', "import { rank } from '@/lib/diagnose'; export default rank;"],
  ['lib/air-and-oil/build-up.ts', "import { z } from 'zod'; export default z;"],
  ['lib/limits/judge.ts', "import { z } from 'zod'; export default z;"],
  ['lib/dossier/content.ts', "import { makeDossier } from '@/lib/services/dossier/make'; export default makeDossier;"],
  ['lib/dossier/content.ts', "import { readFileSync } from 'node:fs'; export default readFileSync;"],
  ['lib/pdf/index.tsx', "import { makeDossier } from '@/lib/services/dossier/make'; export default makeDossier;"],
  ['lib/stopwatch/index.ts', "import { useState } from 'react'; export default useState;"],
  ['lib/break-in/index.ts', "import { useState } from 'react'; export default useState;"],
  ['lib/fitting/index.ts', "import { termLabel } from '@/lib/schemas/terms'; export default termLabel;"],
  ['lib/watch/index.ts', "import { rank } from '@/lib/diagnose'; export default rank;"],
  ['lib/rulebook/back-test/prepare.ts', "import { runOfRecord } from '@/lib/diagnose/record-run'; export default runOfRecord;"],
  ['lib/rulebook/back-test/prepare.ts', "import { readFileSync } from 'node:fs'; export default readFileSync;"],
  ['lib/import/read-table.ts', "import { createReadStream } from 'node:fs'; export default createReadStream;"],
  ['lib/gate/next.ts', "import { rank } from '@/lib/diagnose'; export default rank;"],
  ['lib/schemas/case.ts', "import { unit } from '@/db/schema'; export default unit;"],
  ['lib/services/case/open.ts', "import { database } from '@/db'; export default database;"],
  ['lib/services/case/open.ts', "import { cookies } from 'next/headers'; export default cookies;"],
  ['worker/index.ts', "import { cookies } from 'next/headers'; export default cookies;"],
  ['tests/integration/x.test.ts', "import { database } from '@/db'; export default database;"],
];

const ALLOWED: [file: string, source: string][] = [
  ['components/ui/Button.tsx', "import type { Role } from '@/lib/auth/roles'; export type R = Role;"],
  ['lib/diagnose/record-run.ts', "import { Engine } from 'json-rules-engine'; export default Engine;"],
  ['lib/services/case/open.ts', "import { asTenant } from '@/db/connect'; export default asTenant;"],
];

describe('boundaries between folders', () => {
  const eslint = new ESLint();
  const objections = async (filePath: string, source: string) => {
    const [result] = await eslint.lintText(source, { filePath });
    return result?.messages.filter((message) => message.ruleId === '@typescript-eslint/no-restricted-imports') ?? [];
  };

  it.each(BROKEN)('%s may not say: %s', async (file, source) => {
    expect(await objections(file, source)).toHaveLength(1);
  }, 30_000);

  it.each(ALLOWED)('%s may say: %s', async (file, source) => {
    expect(await objections(file, source)).toEqual([]);
  }, 30_000);
});
