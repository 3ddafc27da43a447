'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useOwnForm } from '@/components/forms/use-own-form';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { Stage } from '@/lib/diagnose/types';
import type { CaseState, CheckView } from '@/lib/schemas/case-view';

export type StageAnswerAction = (previous: ActionState<CaseState>, form: FormData) => Promise<ActionState<CaseState>>;

interface Props {
  action: StageAnswerAction;
  caseId: string;
  check: Pick<CheckView, 'id' | 'name' | 'prompt' | 'kind' | 'answers' | 'unitSymbol' | 'errorSymbol' | 'usualError'>;
  stage: Stage;
  newId: string;
}

/** An answer to a check outside the diagnosis: what was seen at a repair, what was measured for a release. */
export function StageAnswerForm({ action, caseId, check, stage, newId }: Props) {
  const { form, field } = useOwnForm(action, `${check.id}-${stage.kind}`);
  const stageFields: Record<string, string> = stage.kind === 'after-remedy' ? { stage: stage.kind, remedy: String(stage.remedy) } : { stage: stage.kind };
  return (
    <Form form={form} label={`Answer: ${check.name}`} errorTitle="Not saved yet" className="gap-4!">
      <Hidden values={{ id: newId, caseId, checkId: check.id, kind: check.kind === 'measured' ? 'measured' : 'state', ...stageFields }} />
      {check.kind === 'measured' ? (
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField label={`Measured${check.unitSymbol ? `, ${check.unitSymbol}` : ''}`} inputMode="decimal" autoComplete="off" required {...field('value')} />
          <TextField label={`Off by at most${check.errorSymbol ? `, ${check.errorSymbol}` : ''}`} inputMode="decimal" autoComplete="off" required={false} {...field('error', check.usualError)} />
        </div>
      ) : (
        <Answers label={check.prompt} choices={check.answers.map(({ id, label }) => ({ value: id, label }))} field={field('state')} />
      )}
      <RadioGroup label={`How sure: ${check.name}`} look="plain" choices={[{ value: 'sure', label: 'Sure' }, { value: 'think-so', label: 'Think so' }]} {...field('sureness', 'sure')} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">Save the answer<span className="sr-only">: {check.name}</span></SubmitButton>
      </div>
    </Form>
  );
}

function Answers({ label, choices, field }: { label: string; choices: { value: string; label: string }[]; field: { id: string; name: string; error?: string; defaultValue: string } }) {
  return <RadioGroup label={label} choices={choices} columns={2} required {...field} />;
}
