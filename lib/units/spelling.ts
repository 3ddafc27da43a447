import { QUANTITIES, QUANTITY_IDS, type Quantity, type UnitOf } from './quantities';

/**
 * Reduces a written unit to what decides its meaning: "Lbs. / sq. in." becomes "lbs/sqin", "in³" "in3", "5/8″" has
 * unit '"', "ºF" "f", "psi per minute" "psi/minute".
 */
function normalise(written: string): string {
  return written
    .replace(/[º˚]/g, '°') // look-alikes that the next line would turn into letters
    .normalize('NFKC') // superscripts, full-width letters, ℃
    .toLowerCase()
    .replace(/[′’‘]/g, "'")
    .replace(/[″“”]|''/g, '"')
    .replace(/(^|\s+)per\s+|⁄/g, '/')
    .replace(/[\s.^°·]/g, '')
    .replace(/^-(?=[a-z])/, ''); // 5/8-inch
}

/** Every spelling of every unit of a quantity, as it is compared: id, symbol, name and whatever else people write. */
export function spellingsOf(quantity: Quantity): readonly { unit: string; spelling: string }[] {
  return Object.entries(QUANTITIES[quantity].units).flatMap(([unit, { symbol, name, spellings }]) =>
    [...new Set([unit, symbol, name, ...spellings].map(normalise))].map((spelling) => ({ unit, spelling })),
  );
}

const indexes = new Map<Quantity, ReadonlyMap<string, string>>();

function indexOf(quantity: Quantity): ReadonlyMap<string, string> {
  const known = indexes.get(quantity);
  if (known) return known;
  const index = new Map(spellingsOf(quantity).map(({ unit, spelling }) => [spelling, unit]));
  indexes.set(quantity, index);
  return index;
}

/** The unit of this quantity that is written so, if any. */
export function unitSpelt<Q extends Quantity>(quantity: Q, written: string): UnitOf<Q> | undefined {
  return indexOf(quantity).get(normalise(written)) as UnitOf<Q> | undefined;
}

/** Whether nothing is left of a written unit but blanks and full stops. */
export function isBlankUnit(written: string): boolean {
  return normalise(written) === '';
}

/** The sentence kept for this spelling, when it is one that people write and we must refuse. */
export function hintFor(quantity: Quantity, written: string): string | undefined {
  const hints = Object.entries(QUANTITIES[quantity].hints ?? {});
  return hints.find(([spelling]) => normalise(spelling) === normalise(written))?.[1];
}

/** Another quantity that has a unit written so, for a message that says what was typed instead. */
export function otherQuantitySpelt(quantity: Quantity, written: string): Quantity | undefined {
  return QUANTITY_IDS.find((other) => other !== quantity && unitSpelt(other, written) !== undefined);
}
