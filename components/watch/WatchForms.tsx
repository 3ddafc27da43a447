'use client';

import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useForm } from '@/components/forms/use-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { RadioGroup } from '@/components/ui/RadioGroup';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';
import { MeasureField } from '@/components/units/MeasureField';
import { BEGIN_ANSWERS, BEGIN_WORDS, ODOMETER } from '@/lib/schemas/watch';
import type { UnitPreferences } from '@/lib/units';
import { ReadingFields } from './ReadingFields';

type Written = ActionState<{ id: string; caseId: string }>;
export type WatchAction = (previous: Written, form: FormData) => Promise<Written>;

const ANSWERS = BEGIN_ANSWERS.map((value) => ({ value, label: BEGIN_WORDS[value] }));

export function StartForm({ action, ids, begin, units }: { action: WatchAction; ids: Record<string, string>; begin: readonly string[]; units: UnitPreferences }) {
  const form = useForm(action);
  return (
    <Form form={form} label="Begin" errorTitle="Not begun yet">
      <Hidden values={ids} />
      {begin.map((statement, i) => (
        <div key={statement} className="grid gap-2">
          <RadioGroup look="plain" label={statement} choices={ANSWERS} required {...form.field(`begin.${i}.answer`)} />
          <TextField label="Why, if it isn’t so" autoComplete="off" required={false} {...form.field(`begin.${i}.why`)} />
        </div>
      ))}
      <MeasureField label="Odometer now" hint="Without it days alone count." required={false} measure={ODOMETER} units={units} {...form.field('odometer')} />
      <div><SubmitButton className="min-h-14!" pendingLabel="Saving…">Begin to watch</SubmitButton></div>
    </Form>
  );
}

interface ReadProps {
  action: WatchAction;
  ids: Record<string, string>;
  checkId: string;
  prompt: string;
  states: readonly { id: string; label: string }[];
  unit: string | null;
  units: UnitPreferences;
}

export function ReadForm({ action, ids, checkId, ...fields }: ReadProps) {
  const form = useForm(action);
  return (
    <Form form={form} label={fields.prompt} errorTitle="Not saved yet" saved="Saved.">
      <Hidden values={{ ...ids, checkId }} />
      <ReadingFields form={form} prefix={checkId} {...fields} />
      <div><SubmitButton className="min-h-14!" pendingLabel="Saving…">Save the reading</SubmitButton></div>
    </Form>
  );
}

export function LinkForm({ action, ids, checks }: { action: WatchAction; ids: Record<string, string>; checks: readonly { value: string; label: string }[] }) {
  const form = useForm(action);
  return (
    <Disclosure summary="Ask somebody else for a reading" open={form.message !== undefined}>
      <Form form={form} label="Link" errorTitle="Not made yet" saved="The link is made.">
        <Hidden values={ids} />
        <p>Whoever has the link adds one reading, once, and sees nothing else of the case.</p>
        <SelectField label="What to read" options={checks} {...form.field('checkId', checks[0]?.value)} />
        <TextField label="Who it is for" autoComplete="off" required {...form.field('forWhom')} />
        <TextField label="Mail it to" hint="Leave it out to copy the link yourself." type="email" autoComplete="off" required={false} {...form.field('mailTo')} />
        <TextField label="Days until it runs out" inputMode="numeric" autoComplete="off" required {...form.field('days', '14')} />
        <div><SubmitButton pendingLabel="Making…">Make the link</SubmitButton></div>
      </Form>
    </Disclosure>
  );
}

const OUTCOMES = [
  { value: 'held', label: 'It held', hint: 'Everything was read near the end and is in order. The call is proved by what was changed.' },
  { value: 'comeback', label: 'It came back', hint: 'A new case is opened on this unit, and the call is in doubt.' },
  { value: 'lost', label: 'Lost sight of', hint: 'Nobody can look any more. It proves nothing either way.' },
];

type Ended = ActionState<{ id: string; caseId: string; comebackCaseId: string | null }>;

interface EndProps {
  action: (previous: Ended, form: FormData) => Promise<Ended>;
  ids: Record<string, string>;
  /** Open cases that may be the comeback. */
  openCases: readonly { value: string; label: string }[];
}

export function EndForm({ action, ids, openCases }: EndProps) {
  const form = useForm(action);
  return (
    <Disclosure summary="End the watch" open={form.message !== undefined || openCases.length > 0}>
      <Form form={form} label="End the watch" errorTitle="Not ended yet">
        <Hidden values={ids} />
        <p>The case is closed with it.</p>
        <RadioGroup label="What came of it" choices={OUTCOMES} required {...form.field('outcome')} />
        {openCases.length > 0 && <SelectField label="If it came back, it goes on in" placeholder="A new case" options={openCases} {...form.field('goesOnIn')} />}
        <TextField label="Why" hint="Asked for unless it held for the whole span" autoComplete="off" required={false} {...form.field('why')} />
        <div><SubmitButton pendingLabel="Saving…">End the watch</SubmitButton></div>
      </Form>
    </Disclosure>
  );
}

export function RevokeForm({ action, ids, forWhom }: { action: WatchAction; ids: Record<string, string>; forWhom: string }) {
  const form = useForm(action);
  return (
    <Form form={form} label={`Link for ${forWhom}`} errorTitle="Not taken back yet">
      <Hidden values={ids} />
      <div><SubmitButton pendingLabel="Taking back…">Take the link back</SubmitButton></div>
    </Form>
  );
}

export function TakeBackForm({ action, ids }: { action: WatchAction; ids: Record<string, string> }) {
  const form = useForm(action);
  return (
    <Disclosure summary="Take the last reading back" open={form.message !== undefined}>
      <Form form={form} label="Take the last reading back" errorTitle="Not taken back yet">
        <Hidden values={ids} />
        <TextField label="What is wrong with it" autoComplete="off" required {...form.field('whyTakenBack')} />
        <div><SubmitButton pendingLabel="Taking back…">Take it back</SubmitButton></div>
      </Form>
    </Disclosure>
  );
}
