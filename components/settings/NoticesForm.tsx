'use client';

import { Form } from '@/components/forms/Form';
import { useForm } from '@/components/forms/use-form';
import { SelectField } from '@/components/ui/SelectField';
import { SubmitButton } from '@/components/ui/SubmitButton';
import type { ActionState } from '@/lib/auth/form';
import { NOTICE_BY_MAIL, NOTICE_KINDS, type NoticeByMail, type NoticeKind } from '@/lib/schemas/notice';

interface Props {
  action: (previous: ActionState, form: FormData) => Promise<ActionState>;
  choices: Readonly<Record<NoticeKind, NoticeByMail>>;
}

const KIND_WORDS: Record<NoticeKind, string> = {
  assigned: 'A case is given to me',
  'repair-assigned': 'A repair is given to me',
  comeback: 'A case of mine comes back',
  'watch-due': 'A reading is due',
  'mail-bounced': 'A mail can’t be delivered',
};
const MAIL_WORDS: Record<NoticeByMail, string> = { 'at-once': 'By mail at once', daily: 'By mail once a day', never: 'Only in the app' };
const OPTIONS = NOTICE_BY_MAIL.map((value) => ({ value, label: MAIL_WORDS[value] }));

export function NoticesForm({ action, choices }: Props) {
  const form = useForm(action);
  return (
    <Form form={form} saved="You are told so from now on.">
      {NOTICE_KINDS.map((kind) => <SelectField key={kind} label={KIND_WORDS[kind]} options={OPTIONS} {...form.field(kind, choices[kind])} />)}
      <SubmitButton>Save how I am told</SubmitButton>
    </Form>
  );
}
