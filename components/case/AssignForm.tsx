'use client';

import { useActionState } from 'react';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import type { ActionState } from '@/lib/auth/form';

interface Props {
  action: (previous: ActionState<{ id: string }>, form: FormData) => Promise<ActionState<{ id: string }>>;
  caseId: string;
  people: readonly { id: string; name: string }[];
  assignedTo: string | null;
}

/** Gives the case to somebody. */
export function AssignForm({ action, caseId, people, assignedTo }: Props) {
  const [result, submit] = useActionState(action, null);
  const failed = result && !result.ok ? result : null;
  return (
    <form action={submit} className="flex flex-wrap items-end gap-4">
      <input type="hidden" name="caseId" value={caseId} />
      <SelectField
        label="This case is with"
        name="personId"
        placeholder="Nobody"
        defaultValue={assignedTo ?? ''}
        key={assignedTo}
        error={failed ? (failed.fields.personId ?? failed.message) : undefined}
        options={people.map(({ id, name }) => ({ value: id, label: name }))}
      />
      <SubmitButton variant="quiet">Hand over</SubmitButton>
    </form>
  );
}
