'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';

interface Props<Result> {
  action: (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
  /** What the cautions are of: the case, and its check or repair. */
  of: Readonly<Record<string, string>>;
  /** Its name, for a page that has several. */
  about: string;
  cautionIds: readonly string[];
}

/** Says that cautions were read, before anybody goes to the vehicle: what they are of stands behind them. */
export function ReadCautionsForm<Result>({ action, of, about, cautionIds }: Props<Result>) {
  const form = useForm(action);
  return (
    <Form form={form} label={`Cautions: ${about}`} errorTitle="Not noted yet">
      {Object.entries(of).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} readOnly />)}
      {cautionIds.map((id) => <input key={id} type="hidden" name="cautions" value={id} readOnly />)}
      <div>
        <SubmitButton className="min-h-14!">I have read this and will keep to it</SubmitButton>
      </div>
    </Form>
  );
}
