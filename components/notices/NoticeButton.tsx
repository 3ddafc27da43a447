'use client';

import { useActionState, type ReactNode } from 'react';
import { SubmitButton } from '@/components/ui/SubmitButton';
import type { ActionState } from '@/lib/auth/form';

/** What a form of this page posts to; nothing is made of its answer but what went wrong. */
export type NoticeAction = (previous: null, form: FormData) => Promise<ActionState<unknown>>;

interface Props {
  action: NoticeAction;
  /** Left out: it is about all of them. */
  noticeId?: string;
  children: ReactNode;
}

export function NoticeButton({ action, noticeId, children }: Props) {
  const [state, send] = useActionState<ActionState<unknown>, FormData>((_previous, form) => action(null, form), null);
  return (
    <form action={send} className="flex flex-wrap items-center gap-2">
      {noticeId && <input type="hidden" name="noticeId" value={noticeId} />}
      <SubmitButton variant="quiet" size="small" pendingLabel="A moment…">{children}</SubmitButton>
      <span role="status">{state?.ok === false && state.message}</span>
    </form>
  );
}
