'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  unitId: string;
  holdId: string;
  check: string;
}

/** Lifts one check's "do not release", on what is measured or seen now. */
export function LiftForm({ action, unitId, holdId, check }: Props) {
  const form = useForm(action);
  // Several of these stand on one page, so that a field's name is not its id.
  const idOf = (name: string) => `${name}-${holdId}`;
  const field = (name: string) => ({ ...form.field(name), id: idOf(name) });
  const errors = Object.fromEntries(Object.entries(form.errors).map(([name, text]) => [idOf(name), text]));
  return (
    <Disclosure summary={<>Lift it<span className="sr-only">: {check}</span></>} open={form.message !== undefined}>
      <Form form={{ ...form, errors }} label={`Lift: ${check}`} errorTitle="Not lifted yet">
        <input type="hidden" name="unitId" value={unitId} readOnly />
        <input type="hidden" name="holdId" value={holdId} readOnly />
        <p>What you enter is kept with your name and the right you have for it. The maker’s information and local rules come first.</p>
        <TextField label="Measured or seen now" hint="A value with its unit where the check is measured; it is judged by the limit" autoComplete="off" required {...field('found')} />
        <TextField label="How" hint="Gauge, conditions, what was repaired" autoComplete="off" required={false} {...field('note')} />
        <div>
          <SubmitButton pendingLabel="Lifting…">Lift “do not release” by this check</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}
