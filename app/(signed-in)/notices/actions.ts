'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { readAllNotices, readNotice } from '@/lib/services/notice/mark-read';

/** The count stands in the head of every page. */
const everywhere = () => revalidatePath('/', 'layout');

export const openNotice = action(readNotice, {
  after: ({ place }) => {
    everywhere();
    if (place !== null) redirect(place);
  },
});

export const markRead = action(readNotice, { after: everywhere });

export const markAllRead = action(readAllNotices, { after: everywhere });
