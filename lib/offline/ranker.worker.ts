import { buildReasons } from '@/lib/case/build-reasons';
import { buildState } from '@/lib/case/build-state';
import { provisionalParts } from '@/lib/case/provisional';
import { readAnswer } from '@/lib/case/read-answer';
import { compileTrusted } from '@/lib/diagnose/compile';
import type { CompiledRulebook } from '@/lib/diagnose/compiled';
import { AppError } from '@/lib/errors';
import { readKit } from './read-kit';
import { keepBuiltFiles } from './keep-pages';
import type { RankerAnswer, RankerQuestion } from './ranker';
import { waitingOf } from './waiting';

/** Editions are immutable: one is compiled once. */
const compiledEditions = new Map<string, CompiledRulebook>();

async function ready(caseId: string) {
  const found = await readKit(caseId);
  if (!found) return undefined;
  const { kit, rulebook } = found;
  const compiled = compiledEditions.get(kit.editionId) ?? compileTrusted(rulebook);
  compiledEditions.set(kit.editionId, compiled);
  return { kit, compiled };
}

async function answer(question: RankerQuestion): Promise<RankerAnswer['result']> {
  if (question.kind === 'keep') {
    await keepBuiltFiles([self.location.href]);
    return { kind: 'fine' };
  }
  const found = await ready(question.caseId);
  if (!found) return { kind: 'unready' };
  const { kit, compiled } = found;
  if (question.kind === 'read') {
    const check = compiled.checks.get(question.checkId);
    if (!check) return { kind: 'unready' };
    try {
      readAnswer(check, question.answer, kit.person);
      return { kind: 'fine' };
    } catch (error) {
      if (error instanceof AppError) return { kind: 'refused', message: error.message, fields: error.fields };
      throw error;
    }
  }
  const parts = provisionalParts({ compiled, kit, waiting: await waitingOf(kit), now: new Date() });
  return { kind: 'state', kitVersion: kit.version, state: buildState(parts), reasons: buildReasons(parts) };
}

self.onmessage = ({ data }: MessageEvent<{ id: number; question: RankerQuestion }>) => {
  const reply = (result: RankerAnswer['result']) => self.postMessage({ id: data.id, result } satisfies RankerAnswer);
  answer(data.question).then(reply, (error: unknown) => reply({ kind: 'failed', message: String(error) }));
};
