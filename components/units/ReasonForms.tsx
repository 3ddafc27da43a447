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

/** Strikes one of several readings out. */
export function StrikeReadingForm<Result>({ action, unitId, readings }: { action: Action<Result>; unitId: string; readings: readonly Option[] }) {
  const form = useForm(action);
  return (
    <Disclosure summary="Strike out a wrong reading" open={form.message !== undefined}>
      <Form form={form} label="Strike out a wrong reading" errorTitle="Not done yet">
        <input type="hidden" name="unitId" value={unitId} readOnly />
        <p>It stays in the audit, and nothing counts with it any more. Then enter the right one.</p>
        <SelectField label="Reading" placeholder="Choose the reading" required options={readings} {...form.field('readingId')} />
        <TextField label="What is wrong with it" autoComplete="off" required {...form.field('whyWrong')} />
        <div>
          <SubmitButton pendingLabel="Striking out…">Strike it out</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

/** Hides one of several healthy baselines. */
export function HideBaselineForm<Result>({ action, unitId, sets }: { action: Action<Result>; unitId: string; sets: readonly Option[] }) {
  const form = useForm(action);
  return (
    <Disclosure summary="Hide a wrong healthy baseline" open={form.message !== undefined}>
      <Form form={form} label="Hide a wrong healthy baseline" errorTitle="Not done yet">
        <input type="hidden" name="unitId" value={unitId} readOnly />
        <p>Nothing is compared with it any more. Answers that were compared with it stay as they are.</p>
        <SelectField label="Set" placeholder="Choose the set" required options={sets} {...form.field('setId')} />
        <TextField label="Why it doesn’t count" autoComplete="off" required {...form.field('whyHidden')} />
        <div>
          <SubmitButton pendingLabel="Hiding…">Hide the set</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}
