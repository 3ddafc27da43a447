import { z } from 'zod';

/** The words for everything that is chosen from a list: stored by key, shown by label, in forms, lists and API alike. */
const TERMS = {
  vehicleKind: { truck: 'Truck', bus: 'Bus' },
  vocation: {
    'long-haul': 'Long haul',
    regional: 'Regional',
    'stop-start': 'Stop-start',
    'air-for-unloading': 'Air used for unloading',
  },
  condition: { new: 'New', rebuilt: 'Rebuilt' },
  whyOut: {
    'failed-seen': 'It had failed, and that was seen',
    'not-the-cause': 'It wasn’t the cause',
    precaution: 'As a precaution',
    unknown: 'Nobody knows',
  },
  sealant: {
    none: 'None',
    'thin-film': 'A thin film',
    'spray-adhesive': 'Spray adhesive',
    'heavy-bead': 'A heavy bead',
    unknown: 'Nobody knows',
  },
  /** What became of a part when a compressor was fitted. */
  withIt: { changed: 'Changed', kept: 'Kept' },
  yesNo: { yes: 'Yes', no: 'No' },
  cooling: { coolant: 'Coolant', air: 'Air' },
  unloading: {
    'head-unloader': 'Unloader in the head',
    'inlet-unloader': 'Holds the inlet open',
    'discharge-unloader': 'Vents the discharge',
    clutch: 'Clutch',
  },
  intakeType: { 'naturally-aspirated': 'Filter of its own', boosted: 'Boosted engine intake' },
  drainOpening: { 'large-cavity': 'Large cavity', 'small-hole': 'Small hole' },
  oilFeedPlace: { rear: 'Rear', side: 'Side', 'through-drive': 'Through crank and drive' },
  driveGear: { steel: 'Steel', fibre: 'Fibre' },
} as const satisfies Record<string, Record<string, string>>;

export type TermList = keyof typeof TERMS;
export type Term<List extends TermList> = keyof (typeof TERMS)[List] & string;

/** The label of a stored key; the key itself when the list no longer has it. */
export const termLabel = (list: TermList, key: string | null): string | null =>
  key === null ? null : ((TERMS[list] as Record<string, string>)[key] ?? key);

/** For a select or a group of radio buttons, in the order of the list. */
export const termOptions = (list: TermList): { value: string; label: string }[] =>
  Object.entries(TERMS[list]).map(([value, label]) => ({ value, label }));

const keysOf = <List extends TermList>(list: List) => Object.keys(TERMS[list]) as [Term<List>, ...Term<List>[]];

/** One of the list, which has to be chosen. */
export const term = <List extends TermList>(list: List, message: string) => z.enum(keysOf(list), message);

/** One of the list, or nothing, which is null: nobody knows. */
export const optionalTerm = <List extends TermList>(list: List) =>
  z
    .union([z.literal(''), z.enum(keysOf(list))], 'Choose one of the list.')
    .nullish()
    .transform((key) => key || null);
