import { defaultRulebook } from '@/lib/diagnose/default-rulebook';
import { newId } from '@/lib/ids';
import type { AnswerInput } from '@/lib/schemas/case';
import { acknowledgeWork } from '@/lib/services/case/acknowledge-work';
import { recordFinding } from '@/lib/services/case/record-finding';
import type { Ctx } from '@/lib/services/context';
import { createModel } from '@/lib/services/compressor-model/create';
import { answerPoint } from '@/lib/services/fitting/answer';
import { listFittings } from '@/lib/services/fitting/list';
import { startFitting } from '@/lib/services/fitting/start';
import { readCautions } from './support';

const { proof } = defaultRulebook;

export async function readWork(ctx: Ctx, caseId: string, work: 'fitting' | 'break-in'): Promise<void> {
  const cautions = (work === 'fitting' ? proof?.fitting : proof?.breakIn)?.cautions ?? [];
  await acknowledgeWork({ ctx, input: { caseId, work, cautions: cautions.map((cautionId) => ({ id: newId(), cautionId })) } });
}

/** A model of the organisation; who calls has to be an engineer. */
export async function makeModel(ctx: Ctx, more: Partial<Parameters<typeof createModel>[0]['input']> = {}): Promise<string> {
  const id = newId();
  await createModel({ ctx, input: { id, name: `Model ${id.slice(-8)}`, driveGear: 'steel', cooling: 'coolant', ...more } });
  return id;
}

/** Begins a fitting after its cautions were read. */
export async function beginFitting(ctx: Ctx, { caseId, modelId, installedOn, ...more }: { caseId: string; modelId: string; installedOn: string; previousWhyOut?: 'failed-seen' }) {
  await readWork(ctx, caseId, 'fitting');
  const [id, fitId] = [newId(), newId()];
  await startFitting({ ctx, input: { id, caseId, newFitId: fitId, modelId, condition: 'new', installedOn, ...more } });
  return { fittingId: id, fitId };
}

/** Answers every point of a fitting as good practice has it. */
export async function answerAll(ctx: Ctx, { caseId, fittingId, except = [] }: { caseId: string; fittingId: string; except?: string[] }): Promise<void> {
  const fitting = (await listFittings({ ctx, input: { caseId } })).fittings.find(({ id }) => id === fittingId);
  for (const { id: pointId, answers } of fitting?.points ?? []) {
    if (except.includes(pointId)) continue;
    const answer = answers.find(({ against }) => !against)?.id ?? '';
    await answerPoint({ ctx, input: { id: newId(), caseId, fittingId, pointId, answer, value: 'as the maker has it', note: 'seen' } });
  }
}

const IN_ORDER: Record<string, AnswerInput> = {
  'build-up-time': { kind: 'measured', value: '18 s', sureness: 'sure' },
  'cut-out-pressure': { kind: 'measured', value: '128 psi', sureness: 'sure' },
  'cut-in-pressure': { kind: 'measured', value: '106 psi', sureness: 'sure' },
  'leak-down-released': { kind: 'measured', value: '0.5 psi/min', sureness: 'sure' },
  'leak-down-applied': { kind: 'measured', value: '1 psi/min', sureness: 'sure' },
  'low-air-warning': { kind: 'measured', value: '66 psi', sureness: 'sure' },
};

/** Measures what a release asks for, all of it in order unless said otherwise. */
export async function measureForRelease(ctx: Ctx, caseId: string, otherwise: Record<string, AnswerInput | null> = {}): Promise<void> {
  for (const [checkId, answer] of Object.entries({ ...IN_ORDER, ...otherwise })) {
    if (answer === null) continue;
    await readCautions(ctx, caseId, checkId);
    await recordFinding({ ctx, input: { id: newId(), caseId, checkId, stage: { kind: 'release' }, answer, deviceAt: ctx.now().toISOString() } });
  }
}
