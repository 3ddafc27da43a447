import { unitFor, type Quantity, type UnitId, type UnitPreferences } from '@/lib/units';

/** A measure that a form asks for: typed as text, stored in SI in a column, with the text beside it in `asTyped`. */
export interface MeasureField {
  /** In forms and requests. */
  readonly field: string;
  readonly column: string;
  readonly quantity: Quantity;
  /** The unit that tells the size meant, as `unitFor` takes it. */
  readonly like?: UnitId;
}

/** The unit of a figure without one, and the unit it is shown in. */
export const measureUnit = (units: UnitPreferences, { quantity, like }: Pick<MeasureField, 'quantity' | 'like'>): UnitId =>
  unitFor<Quantity>(units, quantity, like);

export const UNIT_MEASURES = [
  { field: 'reservoirs', column: 'reservoirM3', quantity: 'volume', like: 'in3' },
  { field: 'requiredReservoirs', column: 'requiredReservoirM3', quantity: 'volume', like: 'in3' },
] as const satisfies readonly MeasureField[];

export const MODEL_MEASURES = [
  { field: 'displacement', column: 'displacementM3', quantity: 'displacement' },
  { field: 'bore', column: 'boreM', quantity: 'length', like: 'in' },
  { field: 'stroke', column: 'strokeM', quantity: 'length', like: 'in' },
  { field: 'driveRatio', column: 'driveRatio', quantity: 'ratio', like: 'one' },
  { field: 'portBore', column: 'portBoreM', quantity: 'length', like: 'in' },
  { field: 'lineSize', column: 'lineSizeM', quantity: 'length', like: 'in' },
] as const satisfies readonly MeasureField[];

/** How a compressor is run in, where its maker says otherwise than the rulebook. */
export const BREAK_IN_MEASURES = [
  { field: 'breakInPressure', column: 'breakInPressurePa', quantity: 'pressure' },
  { field: 'breakInLeast', column: 'breakInLeastS', quantity: 'duration', like: 'min' },
  { field: 'breakInMost', column: 'breakInMostS', quantity: 'duration', like: 'min' },
] as const satisfies readonly MeasureField[];

export const READING_MEASURES = [
  { field: 'odometer', column: 'odometerM', quantity: 'distance' },
  { field: 'engineHours', column: 'engineS', quantity: 'engineHours' },
] as const satisfies readonly MeasureField[];

/** Readings at the day on which a compressor went on, and came off. */
export const INSTALLED_MEASURES = [
  { field: 'installedOdometer', column: 'installedOdometerM', quantity: 'distance' },
  { field: 'installedEngineHours', column: 'installedEngineS', quantity: 'engineHours' },
] as const satisfies readonly MeasureField[];

export const REMOVED_MEASURES = [
  { field: 'removedOdometer', column: 'removedOdometerM', quantity: 'distance' },
  { field: 'removedEngineHours', column: 'removedEngineS', quantity: 'engineHours' },
] as const satisfies readonly MeasureField[];
