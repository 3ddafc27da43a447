'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { MeasureField } from '@/components/units/MeasureField';
import { OIL_MEASURE, USUAL_SCALE_ERROR } from '@/lib/schemas/oil-catch';
import type { UnitPreferences } from '@/lib/units';

type Written = ActionState<{ id: string; caseId: string }>;
export type CatchAction = (previous: Written, form: FormData) => Promise<Written>;

interface Of {
  action: CatchAction;
  caseId: string;
}

const HOURS = { quantity: 'engineHours' } as const;

const REMINDERS = [
  { value: '', label: 'Not by mail' },
  { value: '1', label: 'Every day' },
  { value: '2', label: 'Every 2 days' },
  { value: '3', label: 'Every 3 days' },
  { value: '7', label: 'Every week' },
];

const Hidden = ({ values }: { values: Record<string, string> }) => Object.entries(values).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} readOnly />);

export function StartForm({ action, caseId, checkId, newId, units }: Of & { checkId: string; newId: string; units: UnitPreferences }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Begin" errorTitle="Not begun yet">
      <Hidden values={{ id: newId, caseId, checkId }} />
      <MeasureField label="Hour meter now" hint="Leave it out if the vehicle has none." required={false} measure={HOURS} units={units} {...form.field('engineHours')} />
      <TextField label="Where the bottle hangs" hint="So that somebody else finds it" autoComplete="off" required={false} {...form.field('place')} />
      <SelectField label="Remind to weigh" hint="Mail to whoever has the case, else to you" required={false} options={REMINDERS} {...form.field('remindEveryDays', '2')} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">The bottle hangs: begin</SubmitButton>
      </div>
    </Form>
  );
}

export function WeighForm({ action, caseId, catchId, newId, units, metered }: Of & { catchId: string; newId: string; units: UnitPreferences; metered: boolean }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Weigh" errorTitle="Not weighed yet">
      <Hidden values={{ id: newId, caseId, catchId }} />
      <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2">
        <MeasureField label="Oil in the bottle" hint="Without the water and the bottle. Empty it afterwards." required measure={OIL_MEASURE} units={units} {...form.field('oil')} />
        <MeasureField label="Give or take" hint={`What the scale can be off; ${USUAL_SCALE_ERROR} unless you say`} required={false} measure={OIL_MEASURE} units={units} {...form.field('oilError')} />
        <MeasureField label="Hour meter now" hint={metered ? undefined : 'It was not read before: give the hours run as well.'} required={metered} measure={HOURS} units={units} {...form.field('engineHours')} />
        <MeasureField label="Hours run since" hint={metered ? 'Only if the meter can’t be read' : 'Since the weighing before, or the start'} required={!metered} measure={HOURS} units={units} {...form.field('hoursRun')} />
      </div>
      <TextField label="Note" hint="Colour, smell, water" autoComplete="off" required={false} {...form.field('note')} />
      <div>
        <SubmitButton className="min-h-14!" pendingLabel="Saving…">Save the weighing</SubmitButton>
      </div>
    </Form>
  );
}

export function EndForm({ action, caseId, catchId }: Of & { catchId: string }) {
  const form = useForm(action);
  return (
    <Disclosure summary="Take the bottle down" open={form.message !== undefined}>
      <Form form={form} label="Take the bottle down" errorTitle="Not done yet">
        <Hidden values={{ caseId, catchId }} />
        <p>What was weighed stays the answer. Weigh what is in the bottle first.</p>
        <TextField label="Why" hint="Only if it ended early" autoComplete="off" required={false} {...form.field('whyEnded')} />
        <div>
          <SubmitButton pendingLabel="Saving…">The bottle is down</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

export function RemindForm({ action, caseId, catchId, everyDays }: Of & { catchId: string; everyDays: number | null }) {
  const form = useForm(action);
  const current = everyDays === null ? '' : String(everyDays);
  const known = REMINDERS.some(({ value }) => value === current);
  return (
    <Disclosure summary="Change the reminder" open={form.message !== undefined}>
      <Form form={form} label="Reminder" errorTitle="Not changed yet" saved="From now on.">
        <Hidden values={{ caseId, catchId }} />
        <SelectField label="Remind to weigh" required={false} options={known ? REMINDERS : [...REMINDERS, { value: current, label: `Every ${current} days` }]} {...form.field('remindEveryDays', current)} />
        <div>
          <SubmitButton pendingLabel="Saving…">Change the reminder</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

export function TakeBackForm({ action, caseId, catchId, weighingId }: Of & { catchId: string; weighingId: string }) {
  const form = useForm(action);
  return (
    <Disclosure summary="Take the last weighing back" open={form.message !== undefined}>
      <Form form={form} label="Take the last weighing back" errorTitle="Not taken back yet">
        <Hidden values={{ caseId, catchId, weighingId }} />
        <p>It stays on this page, struck out, and counts no more. Then enter the right one.</p>
        <TextField label="What is wrong with it" autoComplete="off" required {...form.field('whyTakenBack')} />
        <div>
          <SubmitButton pendingLabel="Taking back…">Take it back</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}
