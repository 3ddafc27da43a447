'use client';

import type { ReactNode } from 'react';
import type { ActionState } from '@/lib/auth/form';
import { Form } from '@/components/forms/Form';
import { Hidden } from '@/components/forms/Hidden';
import { useOwnForm } from '@/components/forms/use-own-form';
import { Disclosure } from '@/components/ui/Disclosure';
import { SelectField, type Option } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import { TextField } from '@/components/ui/TextField';

type Written = ActionState<{ id: string; caseId: string }>;
export type ClaimAction = (previous: Written, form: FormData) => Promise<Written>;

interface Of {
  action: ClaimAction;
  caseId: string;
  currency: string;
}

const Row = ({ children }: { children: ReactNode }) => <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2">{children}</div>;

export function FileClaimForm({ action, caseId, currency, newId }: Of & { newId: string }) {
  const { form, field } = useOwnForm(action, 'claim');
  return (
    <Form form={form} label="Keep a claim" errorTitle="Not kept yet" saved="Kept.">
      <Hidden values={{ id: newId, caseId }} />
      <TextField label="To whom it went" hint="Supplier or warranty desk" autoComplete="off" required {...field('toWhom')} />
      <Row>
        <TextField label="Their reference" autoComplete="off" required={false} {...field('theirReference')} />
        <TextField label="Sent on" type="date" required {...field('sentOn')} />
      </Row>
      <TextField label={`Amount claimed, ${currency}`} inputMode="decimal" autoComplete="off" required={false} {...field('amount')} />
      <div>
        <SubmitButton pendingLabel="Saving…">Keep the claim</SubmitButton>
      </div>
    </Form>
  );
}

const CAME_OF_CLAIM: Option[] = [
  { value: 'paid', label: 'Paid' },
  { value: 'part-paid', label: 'Paid in part' },
  { value: 'denied', label: 'Denied' },
];

export function SettleClaimForm({ action, caseId, currency, claimId, about, isSettled }: Of & { claimId: string; about: string; isSettled: boolean }) {
  const { form, field } = useOwnForm(action, claimId);
  return (
    <Disclosure summary={<>{isSettled ? 'Say otherwise what came of it' : 'Say what came of it'}<span className="sr-only">: {about}</span></>} open={form.message !== undefined}>
      <Form form={form} label={`What came of the claim: ${about}`} errorTitle="Not saved yet">
        <Hidden values={{ caseId, claimId }} />
        <Row>
          <SelectField label="What came of it" placeholder="Choose" required options={CAME_OF_CLAIM} {...field('state')} />
          <TextField label="On" type="date" required {...field('settledOn')} />
        </Row>
        <TextField label={`Amount paid, ${currency}`} hint="Left empty and paid: all that was claimed" inputMode="decimal" autoComplete="off" required={false} {...field('settledAmount')} />
        <TextField label="Why not all of it" hint="In their words, where it was denied or paid in part" autoComplete="off" required={false} {...field('why')} />
        <div>
          <SubmitButton variant="quiet" pendingLabel="Saving…">Save</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}

export function SendCoreForm({ action, caseId, currency, newId, fits }: Of & { newId: string; fits: readonly Option[] }) {
  const { form, field } = useOwnForm(action, 'core');
  return (
    <Form form={form} label="Keep a core" errorTitle="Not kept yet" saved="Kept.">
      <Hidden values={{ id: newId, caseId }} />
      <SelectField label="Which compressor went back" placeholder="Not in the record" required={false} options={fits} {...field('whichFit')} />
      <Row>
        <TextField label="To whom it went" autoComplete="off" required {...field('toWhom')} />
        <TextField label="Sent on" type="date" required {...field('sentOn')} />
      </Row>
      <TextField label={`Credit expected, ${currency}`} inputMode="decimal" autoComplete="off" required={false} {...field('expectedAmount')} />
      <div>
        <SubmitButton pendingLabel="Saving…">Keep the core</SubmitButton>
      </div>
    </Form>
  );
}

const CAME_OF_CORE: Option[] = [
  { value: 'credited', label: 'Credited' },
  { value: 'refused', label: 'Refused' },
];

export function SettleCoreForm({ action, caseId, currency, coreId, about, isSettled }: Of & { coreId: string; about: string; isSettled: boolean }) {
  const { form, field } = useOwnForm(action, coreId);
  return (
    <Disclosure summary={<>{isSettled ? 'Say otherwise what came of it' : 'Say what came of it'}<span className="sr-only">: {about}</span></>} open={form.message !== undefined}>
      <Form form={form} label={`What came of the core: ${about}`} errorTitle="Not saved yet">
        <Hidden values={{ caseId, coreId }} />
        <Row>
          <SelectField label="What came of it" placeholder="Choose" required options={CAME_OF_CORE} {...field('state')} />
          <TextField label="On" type="date" required {...field('settledOn')} />
        </Row>
        <TextField label={`Amount credited, ${currency}`} hint="Left empty and credited: all that was expected" inputMode="decimal" autoComplete="off" required={false} {...field('creditedAmount')} />
        <TextField label="Why it was refused" hint="Cracked, incomplete, the wrong model" autoComplete="off" required={false} {...field('why')} />
        <div>
          <SubmitButton variant="quiet" pendingLabel="Saving…">Save</SubmitButton>
        </div>
      </Form>
    </Disclosure>
  );
}
