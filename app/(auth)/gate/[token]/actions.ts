'use server';

import { redirect } from 'next/navigation';
import { visitorAction } from '@/lib/auth/action';
import type { FormFields } from '@/lib/auth/form';
import { answerGate, enterGate, finishGate } from '@/lib/services/gate/pass';

/** The same page again: what it shows next is the server's to say. */
const goOn = ({ passageId }: { passageId: string }, { token }: FormFields) => redirect(`/gate/${String(token)}?passage=${passageId}`);

export const enter = visitorAction(enterGate, { after: goOn });
export const answer = visitorAction(answerGate, { after: goOn });
export const finish = visitorAction(finishGate, { after: goOn });
