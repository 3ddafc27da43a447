'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { makeGate as make, revokeGate as revoke } from '@/lib/services/gate/links';
import { addSite as add } from '@/lib/services/site/add';
import { changeSite as change } from '@/lib/services/site/change';

const LIST = '/settings/sites';

const backToList = () => {
  revalidatePath(LIST);
  redirect(LIST);
};

export const addSite = action(add, { after: backToList });
export const changeSite = action(change, { after: backToList });

const seeGates = ({ siteId }: { siteId: string }) => revalidatePath(`${LIST}/${siteId}`);

export const makeGate = action(make, { after: seeGates });
export const revokeGate = action(revoke, { after: seeGates });
