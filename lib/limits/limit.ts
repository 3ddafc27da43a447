/** What of a unit decides which limit holds for it. */
export interface LimitFacts {
  modelId: string | null;
  /** ISO 3166-1 alpha-2. */
  country: string;
  vehicleKind: string;
  /** "YYYY-MM-DD"; null: nobody knows. */
  builtOn: string | null;
}

/** A limit that an organisation adopted. SI; null: no limit on that side. */
export interface Limit {
  id: string;
  checkId: string;
  least: number | null;
  most: number | null;
  /** The highest value itself is past the limit: "less than 2". */
  below: boolean;
  source: string;
}

/** With what it is for; null: any. */
export interface AdoptedLimit extends Limit {
  modelId: string | null;
  country: string | null;
  vehicleKind: string | null;
  /** Built on this day or later. */
  builtFrom: string | null;
  /** Built before this day. */
  builtBefore: string | null;
  adoptedAt: Date;
}
