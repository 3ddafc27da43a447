'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useOwnForm } from '@/components/forms/use-own-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

type Written = ActionState<{ id: string; caseId: string }>;
export type RepairAction = (previous: Written, form: FormData) => Promise<Written>;

interface Of {
  action: RepairAction;
  caseId: string;
  /** Its name, because a page has several. */
  about: string;
  people: readonly Option[];
}

export function ChooseForm({ action, caseId, about, people, newId, remedyId, isFirst }: Of & { newId: string; remedyId: string; isFirst: boolean }) {
  const { form, field } = useOwnForm(action, remedyId);
  return (
    <Disclosure summary={<>Choose it<span className="sr-only">: {about}</span></>} open={form.message !== undefined}>
      <Form form={form} label={`Choose: ${about}`} errorTitle="Not chosen yet">
        <Hidden values={{ id: newId, caseId, remedyId }} />
        {!isFirst && <TextField label="Why before those above it" hint="What you saw" autoComplete="off" required {...field('whyBefore')} />}
        <TextField label="Planned for" type="date" required={false} {...field('plannedOn')} />
        <SelectField label="Who does it" placeholder="Nobody yet" required={false} options={people} {...field('assignedTo')} />
        <div>
          <SubmitButton pendingLabel="Saving…">Choose this repair</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

interface OfRepair extends Omit<Of, 'people'> {
  repairId: string;
}

export function PlanForm({ action, caseId, about, people, repairId, plannedOn, assignedTo }: OfRepair & Pick<Of, 'people'> & { plannedOn: string | null; assignedTo: string | null }) {
  const { form, field } = useOwnForm(action, repairId);
  return (
    <Disclosure summary={<>When and who<span className="sr-only">: {about}</span></>} open={form.message !== undefined}>
      <Form form={form} label={`When and who: ${about}`} errorTitle="Not changed yet">
        <Hidden values={{ caseId, repairId }} />
        <TextField label="Planned for" type="date" required={false} {...field('plannedOn', plannedOn)} />
        <SelectField label="Who does it" placeholder="Nobody yet" required={false} options={people} {...field('assignedTo', assignedTo)} />
        <div>
          <SubmitButton variant="quiet" pendingLabel="Saving…">Change the plan</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

/** What is said of one step. The value is the maker's: nothing is filled in. */
export function StepForm({ action, caseId, repairId, step, newId, isMarked }: { action: RepairAction; caseId: string; repairId: string; step: number; newId: string; isMarked: boolean }) {
  const { form, field } = useOwnForm(action, `${repairId}-${step}`);
  const mark = (value: string, label: string, variant: 'primary' | 'quiet') => (
    <SubmitButton variant={variant} name="mark" value={value} pendingLabel="Saving…">{label}<span className="sr-only">: step {step + 1}</span></SubmitButton>
  );
  return (
    <Form form={form} label={`Step ${step + 1}`} errorTitle="Not saved yet" className="gap-3!">
      <Hidden values={{ id: newId, caseId, repairId, step: String(step) }} />
      <div className="flex flex-wrap gap-3">
        {mark('done', 'Done', isMarked ? 'quiet' : 'primary')}
        {mark('not-done', 'Not done', 'quiet')}
        {mark('not-applicable', 'Doesn’t apply', 'quiet')}
      </div>
      <Disclosure summary={<>Value or note<span className="sr-only"> at step {step + 1}</span></>}>
        <div className="grid gap-4">
          <TextField label="Value" hint="As the maker gives it: a torque, a clearance. Enter it before you say what was done." autoComplete="off" required={false} {...field('value')} />
          <TextField label="Note" autoComplete="off" required={false} {...field('note')} />
        </div>
      </Disclosure>
    </Form>
  );
}

export function EndForms({ action, caseId, about, repairId }: OfRepair) {
  const done = useOwnForm(action, `${repairId}-done`);
  const dropped = useOwnForm(action, `${repairId}-dropped`);
  return (
    <>
      <Form form={done.form} label={`Finish: ${about}`} errorTitle="Not finished yet">
        <Hidden values={{ caseId, repairId, outcome: 'done' }} />
        <div>
          <SubmitButton className="min-h-14!" pendingLabel="Saving…">The repair is done</SubmitButton>
        </div>
      </Form>
      <Disclosure summary={<>Drop it<span className="sr-only">: {about}</span></>} open={dropped.form.message !== undefined}>
        <Form form={dropped.form} label={`Drop: ${about}`} errorTitle="Not dropped yet">
          <Hidden values={{ caseId, repairId, outcome: 'dropped' }} />
          <TextField label="Why" autoComplete="off" required {...dropped.field('whyDropped')} />
          <div>
            <SubmitButton variant="quiet" pendingLabel="Saving…">Drop this repair</SubmitButton>
          </div>
        </Form>
      </Disclosure>
    </>
  );
}
