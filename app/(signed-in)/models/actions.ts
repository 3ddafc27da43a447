'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { changeModel as change } from '@/lib/services/compressor-model/change';
import { createModel as add } from '@/lib/services/compressor-model/create';
import { hideModel as hide, showModel as show } from '@/lib/services/compressor-model/hide';
import { editing } from '../editing';

const PAGES = '/models';

const toModel = ({ id }: { id: string }) => redirect(`/models/${id}`);
const readAnew = () => revalidatePath(PAGES, 'layout');

export const addModel = action(add, { after: toModel });
export const changeModel = editing(action(change, { after: toModel }), PAGES);
export const hideModel = action(hide, { after: readAnew });
export const showModel = action(show, { after: readAnew });
