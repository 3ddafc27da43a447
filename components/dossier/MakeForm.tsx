'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useForm } from '@/components/forms/use-form';
import { CheckboxField } from '@/components/ui/CheckboxField';
import { Disclosure } from '@/components/ui/Disclosure';
import { FieldError } from '@/components/ui/FieldError';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { DOSSIER_SECTIONS } from '@/lib/schemas/dossier-content';

interface Props {
  action: (previous: ActionState<{ id: string; caseId: string; reference: string }>, form: FormData) => Promise<ActionState<{ id: string; caseId: string; reference: string }>>;
  caseId: string;
  newId: string;
  photos: readonly { id: string; name: string }[];
  /** What this country prints on. */
  paper: 'a4' | 'letter';
}

const PAPER = [
  { value: 'a4', label: 'A4' },
  { value: 'letter', label: 'US letter' },
];

/** All that the case holds, less what its maker leaves out. */
export function MakeForm({ action, caseId, newId, photos, paper }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} label="Make a dossier" errorTitle="Not made yet" saved="The PDF is being made. It stands below in a moment.">
      <Hidden values={{ id: newId, caseId }} />
      <Disclosure summary="Leave something out" open={form.message !== undefined}>
        <fieldset className="grid" id="leaveOut" tabIndex={-1}>
          <legend className="mb-1 font-bold">Tick what stays out. The dossier says that it was left out.</legend>
          {DOSSIER_SECTIONS.map(({ id, title, about }) => (
            <CheckboxField key={id} id={`leave-out-${id}`} name="leaveOut" value={id} label={title} hint={about} defaultChecked={form.isTicked('leaveOut', id, false)} />
          ))}
          <FieldError id="leaveOut-error" error={form.errors.leaveOut} />
        </fieldset>
        {photos.length > 0 && (
          <fieldset className="mt-4 grid" id="leaveOutPhotos" tabIndex={-1}>
            <legend className="mb-1 font-bold">Photos to leave out</legend>
            {photos.map(({ id, name }) => (
              <CheckboxField key={id} id={`leave-out-${id}`} name="leaveOutPhotos" value={id} label={name} defaultChecked={form.isTicked('leaveOutPhotos', id, false)} />
            ))}
            <FieldError id="leaveOutPhotos-error" error={form.errors.leaveOutPhotos} />
          </fieldset>
        )}
      </Disclosure>
      <div className="grid">
        <CheckboxField name="withholdNames" label="Withhold names of people" hint="They become Technician 1, Technician 2. What somebody wrote into a note stays as it is." defaultChecked={form.isTicked('withholdNames', 'on', false)} />
        <CheckboxField name="withholdFleet" label="Withhold whose unit it is" hint="Organisation, site and fleet number stay out." defaultChecked={form.isTicked('withholdFleet', 'on', false)} />
      </div>
      <SelectField label="Paper" required options={PAPER} {...form.field('paper', paper)} />
      <div>
        <SubmitButton pendingLabel="Making…">Make the dossier</SubmitButton>
      </div>
    </Form>
  );
}
