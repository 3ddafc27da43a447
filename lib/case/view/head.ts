import type { CaseHead } from '@/lib/schemas/case-view';
import { formatQuantity, type UnitPreferences } from '@/lib/units';

interface Row {
  id: string;
  number: number;
  unitId: string;
  fleetNumber: string;
  vehicleKind: string;
  siteName: string;
  timeZone: string;
  modelName: string | null;
  installedOn: string | null;
  complaintWords: string | null;
  odometerM: number | null;
  openedBy: string;
  openedAt: Date;
  editionNumber: number;
}

/** The head of the case page: what doesn't change with the answers. */
export function headView(row: Row, units: UnitPreferences): CaseHead {
  return {
    id: row.id,
    number: row.number,
    unit: { id: row.unitId, fleetNumber: row.fleetNumber, vehicleKind: row.vehicleKind },
    siteName: row.siteName,
    timeZone: row.timeZone,
    fit: row.modelName && row.installedOn ? { modelName: row.modelName, installedOn: row.installedOn } : null,
    complaintWords: row.complaintWords,
    odometer: row.odometerM === null ? null : formatQuantity(row.odometerM, { quantity: 'distance', unit: units.distance }),
    openedBy: row.openedBy,
    openedAt: row.openedAt.toISOString(),
    editionNumber: row.editionNumber,
  };
}
