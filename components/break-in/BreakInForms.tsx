'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Hidden } from '@/components/forms/Hidden';
import { useOwnForm } from '@/components/forms/use-own-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import type { HotCheck } from '@/lib/break-in';

type Written = ActionState<{ id: string; caseId: string }>;
export type BreakInAction = (previous: Written, form: FormData) => Promise<Written>;

export function StartForm({ action, caseId, newId }: { action: BreakInAction; caseId: string; newId: string }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Begin the run" errorTitle="Not begun yet">
      <Hidden values={{ id: newId, caseId }} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">It runs: start the time</SubmitButton>
      </div>
    </Form>
  );
}

interface OfRun {
  action: BreakInAction;
  caseId: string;
  runId: string;
}

export function EndRunForms({ action, caseId, runId }: OfRun) {
  const done = useOwnForm(action, 'done');
  const stopped = useOwnForm(action, 'stopped');
  return (
    <>
      <Form form={done.form} label="End the run" errorTitle="Not ended yet">
        <Hidden values={{ caseId, runId, outcome: 'done' }} />
        <div>
          <SubmitButton className="min-h-14!" pendingLabel="Saving…">The run is done</SubmitButton>
        </div>
      </Form>
      <Disclosure summary="Stop it before its time" open={stopped.form.message !== undefined}>
        <Form form={stopped.form} label="Stop the run" errorTitle="Not stopped yet">
          <Hidden values={{ caseId, runId, outcome: 'stopped' }} />
          <TextField label="Why it was stopped" autoComplete="off" required {...stopped.field('whyStopped')} />
          <div>
            <SubmitButton variant="quiet" pendingLabel="Saving…">Stop the run</SubmitButton>
          </div>
        </Form>
      </Disclosure>
    </>
  );
}

/** What was seen for leaks while it was hot. */
export function HotCheckForm({ action, caseId, runId, seen }: OfRun & { seen: HotCheck | null }) {
  const { form, field } = useOwnForm(action, `hot-${runId}`);
  return (
    <Form form={form} label="Hot check" errorTitle="Not saved yet">
      <Hidden values={{ caseId, runId }} />
      <RadioGroup label="Oil at flange, feed or return" columns={2} required choices={[{ value: 'none', label: 'Dry' }, { value: 'leak', label: 'It leaks' }]} {...field('oil', seen?.oil)} />
      <RadioGroup label="Coolant at head or lines" columns={3} required choices={[{ value: 'none', label: 'Dry' }, { value: 'leak', label: 'It leaks' }, { value: 'not-applicable', label: 'Cooled by air' }]} {...field('coolant', seen?.coolant)} />
      <TextField label="Where it leaks" autoComplete="off" required={false} {...field('where', seen?.where)} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">Save what you saw</SubmitButton>
      </div>
    </Form>
  );
}
