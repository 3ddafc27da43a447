'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { action } from '@/lib/auth/action';
import { openCase } from '@/lib/services/case/open';
import { removeView } from '@/lib/services/saved-view/remove';
import { renameView } from '@/lib/services/saved-view/rename';
import { saveView } from '@/lib/services/saved-view/save';

type Fields = Record<string, string | string[]>;

const one = (fields: Fields, name: string) => {
  const value = fields[name];
  const text = Array.isArray(value) ? value[0] : value;
  return text === '' ? undefined : text;
};

/** A unit that was picked, or else what was typed to make one. */
function unitOf(fields: Fields) {
  const unitId = one(fields, 'unitId');
  if (unitId && unitId !== 'new') return { kind: 'known', unitId };
  return {
    kind: 'new',
    id: one(fields, 'newUnitId'),
    fleetNumber: one(fields, 'fleetNumber') ?? '',
    siteId: one(fields, 'siteId'),
    vehicleKind: one(fields, 'vehicleKind'),
  };
}

export const openCaseFromForm = action(openCase, {
  input: (fields) => ({
    id: one(fields, 'id'),
    unit: unitOf(fields),
    complaints: [fields.complaints ?? []].flat(),
    complaintWords: one(fields, 'complaintWords'),
    odometer: one(fields, 'odometer'),
    engineHours: one(fields, 'engineHours'),
    odometerReplaced: one(fields, 'odometerReplaced') === 'yes',
  }),
  after: ({ id }) => redirect(`/cases/${id}`),
});

const listAnew = () => revalidatePath('/cases');

export const saveViewFromForm = action(saveView, { after: listAnew });
export const renameViewFromForm = action(renameView, { after: listAnew });
export const removeViewFromForm = action(removeView, { after: listAnew });
