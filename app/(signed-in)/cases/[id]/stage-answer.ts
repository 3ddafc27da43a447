import type { FormFields } from '@/lib/auth/form';

/** An answer outside the diagnosis, from its form to what the service takes. */
export function stageAnswer(fields: FormFields) {
  const { id, caseId, checkId, stage, remedy, kind, state, value, error, sureness } = fields as Record<string, string | undefined>;
  return {
    id,
    caseId,
    checkId,
    stage: stage === 'after-remedy' ? { kind: stage, remedy: Number(remedy) } : { kind: stage },
    answer: kind === 'measured' ? { kind, value: value ?? '', error: error || undefined, sureness } : { kind, state, sureness },
    deviceAt: new Date().toISOString(),
  };
}
