'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Hidden } from '@/components/forms/Hidden';
import { useOwnForm } from '@/components/forms/use-own-form';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { ReadingFields } from '@/components/units/ReadingFields';
import { dayText } from '@/lib/schemas/day-text';
import type { InstallPointView } from '@/lib/schemas/fitting';
import { termOptions } from '@/lib/schemas/terms';
import type { UnitPreferences } from '@/lib/units';

type Action<Result> = (previous: ActionState<Result>, form: FormData) => Promise<ActionState<Result>>;
export type StartAction = Action<{ id: string; caseId: string; fitId: string }>;
export type FittingAction = Action<{ id: string; caseId: string }>;

interface StartProps {
  action: StartAction;
  caseId: string;
  newIds: { fitting: string; fit: string };
  models: readonly { id: string; name: string }[];
  standing: { modelName: string; installedOn: string } | null;
  units: UnitPreferences;
  /** Today at the unit's site. */
  today: string;
}

/** Which compressor goes on, and why the one before comes off. */
export function StartFittingForm({ action, caseId, newIds, models, standing, units, today }: StartProps) {
  const form = useForm(action);
  const condition = form.field('condition');
  return (
    <Form form={form} label="Begin the fitting" errorTitle="Not begun yet">
      <Hidden values={{ id: newIds.fitting, newFitId: newIds.fit, caseId }} />
      {standing && (
        <SelectField
          label="Why the old one comes off"
          hint={`The ${standing.modelName}, on the unit since ${dayText(standing.installedOn)}`}
          placeholder="Choose why"
          required
          options={termOptions('whyOut')}
          {...form.field('previousWhyOut')}
        />
      )}
      <SelectField label="Model that goes on" placeholder="Choose a model" required options={models.map(({ id, name }) => ({ value: id, label: name }))} {...form.field('modelId')} />
      <RadioGroup label="New or rebuilt" choices={termOptions('condition')} columns={2} required name="condition" error={condition.error} defaultValue={condition.defaultValue} />
      <TextField label="Fitted on" type="date" max={today} required {...form.field('installedOn', today)} />
      <ReadingFields form={form} units={units} names={{ odometer: 'installedOdometer', engineHours: 'installedEngineHours' }} stored={{}} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">Begin the fitting</SubmitButton>
      </div>
    </Form>
  );
}

interface PointProps {
  action: FittingAction;
  caseId: string;
  fittingId: string;
  point: InstallPointView;
  newId: string;
}

/** The answer to one point of the install record. */
export function PointForm({ action, caseId, fittingId, point, newId }: PointProps) {
  const { form, field } = useOwnForm(action, point.id);
  const asks = (what: 'value' | 'note') => point.answers.some((answer) => answer.asks === what || answer.asks === 'value-and-note');
  const labels = (what: 'value' | 'note') => point.answers.filter((answer) => answer.asks === what || answer.asks === 'value-and-note').map(({ label }) => `“${label}”`);
  const needed = (what: 'value' | 'note') => (labels(what).length === point.answers.length ? undefined : `Needed for ${labels(what).join(' and ')}`);
  return (
    <Form form={form} label={point.name} errorTitle="Not saved yet" className="gap-4!">
      <Hidden values={{ id: newId, caseId, fittingId, pointId: point.id }} />
      <RadioGroup label={point.prompt} columns={2} required choices={point.answers.map(({ id, label }) => ({ value: id, label }))} {...field('answer', point.said?.answer)} />
      {asks('value') && <TextField label={`Value: ${point.name}`} hint={[point.valueHint, needed('value')].filter(Boolean).join('. ')} autoComplete="off" required={false} {...field('value', point.said?.value)} />}
      <TextField label={`Note: ${point.name}`} hint={[point.noteHint, asks('note') ? needed('note') : undefined].filter(Boolean).join('. ') || undefined} autoComplete="off" required={false} {...field('note', point.said?.note)} />
      <div>
        <SubmitButton className="min-h-touch" variant={point.said ? 'quiet' : 'primary'} pendingLabel="Saving…">{point.said ? 'Change the answer' : 'Save the answer'}<span className="sr-only">: {point.name}</span></SubmitButton>
      </div>
    </Form>
  );
}

export function FinishForm({ action, caseId, fittingId }: Pick<PointProps, 'caseId' | 'fittingId'> & { action: FittingAction }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Finish the fitting" errorTitle="Not finished yet">
      <Hidden values={{ caseId, fittingId }} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">The fitting is finished</SubmitButton>
      </div>
    </Form>
  );
}
