'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { invite } from '@/lib/services/invitation/invite';
import { resendInvitation } from '@/lib/services/invitation/resend';
import { withdrawInvitation } from '@/lib/services/invitation/withdraw';
import { changeMember } from '@/lib/services/membership/change';
import { endMembership } from '@/lib/services/membership/end';

const LIST = '/settings/people';

const backToList = () => {
  revalidatePath(LIST);
  redirect(LIST);
};
const refreshList = () => revalidatePath(LIST);

export const invitePerson = action(invite, { after: backToList });
export const sendInvitationAgain = action(resendInvitation, { after: refreshList });
export const takeInvitationBack = action(withdrawInvitation, { after: refreshList });
export const saveMember = action(changeMember, { after: backToList });
export const letGo = action(endMembership, { after: backToList });
