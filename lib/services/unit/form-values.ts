import type { UnitRow } from '@/db/queries/unit';
import { UNIT_MEASURES } from '@/lib/schemas/measures';
import type { UnitPreferences } from '@/lib/units';
import { chosen, plain, type FormValue } from '../form-value';
import { fieldText } from '../units-of-measure';

/** The fields of the form as a unit fills them. */
export function unitFormValues(row: UnitRow, units: UnitPreferences) {
  const measure = (field: (typeof UNIT_MEASURES)[number]) => plain(fieldText(units, field, row));
  return {
    fleetNumber: plain(row.fleetNumber),
    siteId: { text: row.siteId, shown: row.siteName },
    vehicleKind: chosen('vehicleKind', row.vehicleKind),
    vocation: chosen('vocation', row.vocation),
    country: plain(row.country),
    builtOn: plain(row.builtOn),
    engineFamily: plain(row.engineFamily),
    reservoirs: measure(UNIT_MEASURES[0]),
    requiredReservoirs: measure(UNIT_MEASURES[1]),
    reservoirCount: plain(row.reservoirCount),
    dryerCartridgeChangedOn: plain(row.dryerCartridgeChangedOn),
    note: plain(row.note),
  } satisfies Record<string, FormValue>;
}
