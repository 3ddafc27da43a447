'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

type Action<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;

interface HideProps<Result> {
  action: Action<Result>;
  /** Name and value of the id that is sent. */
  id: { name: string; value: string };
  /** "Hide this unit": says what is folded away, and stands on the button. */
  title: string;
  /** What it does, and what stays. */
  explains: string;
}

/** Takes something out of the lists, with why. Folded away: it is done once in years. */
export function HideForm<Result>({ action, id, title, explains }: HideProps<Result>) {
  const form = useForm(action);
  return (
    <Disclosure summary={title} open={form.message !== undefined}>
      <Form form={form} label={title} errorTitle="Not done yet">
        <input type="hidden" name={id.name} value={id.value} readOnly />
        <p>{explains}</p>
        <TextField label="Why" autoComplete="off" required {...form.field('reason')} />
        <div>
          <SubmitButton>{title}</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

/** Puts something hidden back. */
export function ShowForm<Result>({ action, id }: Pick<HideProps<Result>, 'action' | 'id'>) {
  const form = useForm(action);
  return (
    <Form form={form} label="Show it again" errorTitle="Not done yet">
      <input type="hidden" name={id.name} value={id.value} readOnly />
      <div>
        <SubmitButton variant="quiet">Show it again</SubmitButton>
      </div>
    </Form>
  );
}

interface PickProps<Result> {
  action: Action<Result>;
  unitId: string;
  title: string;
  explains: string;
  /** What is picked, by its field. */
  pick: { name: string; label: string; placeholder: string; options: readonly Option[] };
  /** Its field is not called `reason`: it stands on one page with that of hiding the unit, and a field's name is its id. */
  why: { name: string; label: string };
  submit: { label: string; pending: string };
}

/** Takes one of several things of a unit out of what counts, with why. */
function PickOneForm<Result>({ action, unitId, title, explains, pick, why, submit }: PickProps<Result>) {
  const form = useForm(action);
  return (
    <Disclosure summary={title} open={form.message !== undefined}>
      <Form form={form} label={title} errorTitle="Not done yet">
        <input type="hidden" name="unitId" value={unitId} readOnly />
        <p>{explains}</p>
        <SelectField label={pick.label} placeholder={pick.placeholder} required options={pick.options} {...form.field(pick.name)} />
        <TextField label={why.label} autoComplete="off" required {...form.field(why.name)} />
        <div>
          <SubmitButton pendingLabel={submit.pending}>{submit.label}</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

/** Strikes one of several readings out. */
export const StrikeReadingForm = <Result,>({ readings, ...rest }: Pick<PickProps<Result>, 'action' | 'unitId'> & { readings: readonly Option[] }) => (
  <PickOneForm
    {...rest}
    title="Strike out a wrong reading"
    explains="It stays in the audit, and nothing counts with it any more. Then enter the right one."
    pick={{ name: 'readingId', label: 'Reading', placeholder: 'Choose the reading', options: readings }}
    why={{ name: 'whyWrong', label: 'What is wrong with it' }}
    submit={{ label: 'Strike it out', pending: 'Striking out…' }}
  />
);

/** Hides one of several healthy baselines. */
export const HideBaselineForm = <Result,>({ sets, ...rest }: Pick<PickProps<Result>, 'action' | 'unitId'> & { sets: readonly Option[] }) => (
  <PickOneForm
    {...rest}
    title="Hide a wrong healthy baseline"
    explains="Nothing is compared with it any more. Answers that were compared with it stay as they are."
    pick={{ name: 'setId', label: 'Set', placeholder: 'Choose the set', options: sets }}
    why={{ name: 'whyHidden', label: 'Why it doesn’t count' }}
    submit={{ label: 'Hide the set', pending: 'Hiding…' }}
  />
);
