'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

interface Props<Result> {
  action: (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
  timeZones: readonly string[];
  /** Left out for a new one. */
  site?: { id: string; name: string; timeZone: string };
}

export function SiteForm<Result>({ action, timeZones, site }: Props<Result>) {
  const form = useForm(action);
  return (
    <Form form={form}>
      {site && <input type="hidden" name="siteId" value={site.id} />}
      <TextField label="Name" hint="As people here call it" required {...form.field('name', site?.name)} />
      <TextField label="Time zone" hint="Begin typing, such as America/Chicago" list="time-zones" autoComplete="off" required {...form.field('timeZone', site?.timeZone)} />
      <datalist id="time-zones">
        {timeZones.map((zone) => <option key={zone} value={zone} />)}
      </datalist>
      <SubmitButton>{site ? 'Save the site' : 'Add the site'}</SubmitButton>
    </Form>
  );
}
