import { toSi, type Quantity, type UnitId, type UnitOf } from '@/lib/units';

/** Where a figure comes from, and so how it may be called. */
export type Standing =
  /** A regulation: binds what it names, often only new vehicles. */
  | 'regulation'
  /** What a driver's test or handbook asks: not a regulation of the vehicle. */
  | "driver's check"
  | 'standard';

/**
 * A published figure that an organisation can adopt as its limit. None holds by itself: each is shown with its source,
 * and for the country, vehicle and build date that the source is for.
 */
export interface PublishedLimit {
  readonly id: string;
  readonly what: string;
  /** Under what conditions it is meant. */
  readonly when?: string;
  readonly quantity: Quantity;
  /** The unit that the source writes it in. */
  readonly like: UnitId;
  /** SI; a figure with both is a band. */
  readonly least?: number;
  readonly most?: number;
  /** The figure itself is past the limit: "less than 2". */
  readonly below?: boolean;
  readonly country: string;
  /** State or province. */
  readonly region?: string;
  readonly vehicle: 'any' | 'bus' | 'truck' | 'trailer' | 'single vehicle' | 'combination' | 'not a vehicle';
  /** First day of manufacture that it is for, where the source has one: "1997-03-01". */
  readonly builtFrom?: string;
  readonly standing: Standing;
  readonly source: string;
  /** Remembered, not read: whoever adopts it should look it up. */
  readonly fromMemory?: boolean;
}

type Written<Q extends Quantity> = Omit<PublishedLimit, 'quantity' | 'like' | 'least' | 'most'> & {
  readonly quantity: Q;
  readonly like: UnitOf<Q>;
  /** In `like`. */
  readonly least?: number;
  readonly most?: number;
};

/** A figure as its source writes it. */
export function limit<Q extends Quantity>({ least, most, ...rest }: Written<Q>): PublishedLimit {
  const si = (value: number) => toSi(value, rest.quantity, rest.like);
  return { ...rest, ...(least === undefined ? {} : { least: si(least) }), ...(most === undefined ? {} : { most: si(most) }) };
}
