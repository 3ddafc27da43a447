'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { changeFit as correct, takeOutFit as takeOut } from '@/lib/services/fit/change';
import { createFit as create } from '@/lib/services/fit/create';
import { hideFit as strike } from '@/lib/services/fit/hide';
import { hideBaseline as putAway } from '@/lib/services/baseline/hide';
import { recordBaseline as measure } from '@/lib/services/baseline/record';
import { addReading as noteDown } from '@/lib/services/unit/add-reading';
import { changeUnit as change } from '@/lib/services/unit/change';
import { createUnit as add } from '@/lib/services/unit/create';
import { hideUnit as hide, showUnit as show } from '@/lib/services/unit/hide';
import { liftHold as lift } from '@/lib/services/unit-hold/lift';
import { strikeReading as strikeOut } from '@/lib/services/unit/strike-reading';
import { editing } from '../editing';

const PAGES = '/units';

const toUnit = ({ id }: { id: string }) => redirect(`/units/${id}`);
const toItsUnit = ({ unitId }: { unitId: string }) => redirect(`/units/${unitId}`);
const readAnew = () => revalidatePath(PAGES, 'layout');

export const addUnit = action(add, { after: toUnit });
export const changeUnit = editing(action(change, { after: toUnit }), PAGES);
export const hideUnit = action(hide, { after: readAnew });
export const showUnit = action(show, { after: readAnew });

export const addReading = action(noteDown, { after: toItsUnit });
export const strikeReading = action(strikeOut, { after: readAnew });

export const liftHold = action(lift, { after: readAnew });
export const recordBaseline = action(measure, { after: toItsUnit });
export const hideBaseline = action(putAway, { after: readAnew });

export const addFit = action(create, { after: toItsUnit });
export const changeFit = editing(action(correct, { after: toItsUnit }), PAGES);
export const takeOutFit = editing(action(takeOut, { after: toItsUnit }), PAGES);
export const strikeFit = action(strike, { after: toItsUnit });
