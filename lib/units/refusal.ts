import { QUANTITIES, unitDefinition, unitsOf, type Quantity } from './quantities';
import { hintFor, otherQuantitySpelt } from './spelling';

/** Why a text was not understood: one or two plain sentences to show beside the field. */
export interface RefusedQuantity {
  readonly ok: false;
  readonly message: string;
}

/** Enough of a text to recognise it by. */
const SHOWN = 30;

export function refuse(message: string): RefusedQuantity {
  return { ok: false, message };
}

/** Nothing was typed. */
export function refuseEmpty(quantity: Quantity): RefusedQuantity {
  const { called, examples } = QUANTITIES[quantity];
  return refuse(`Type ${called}, such as ${examples.join(' or ')}.`);
}

/** The text can't be read as this quantity, and there is nothing better to say. */
export function refuseUnknown(asTyped: string, quantity: Quantity): RefusedQuantity {
  const { called, examples } = QUANTITIES[quantity];
  return refuse(`${quoted(asTyped)} is not ${called} that we know. Try ${examples.join(' or ')}.`);
}

/** The number is clear and its unit is not one of this quantity's. */
export function refuseUnit(written: string, asTyped: string, quantity: Quantity): RefusedQuantity {
  const hint = hintFor(quantity, written);
  if (hint !== undefined) return refuse(`${quoted(asTyped)} is not clear. ${hint}`);

  const other = otherQuantitySpelt(quantity, written);
  if (other === undefined) return refuseUnknown(asTyped, quantity);
  return refuse(`${quoted(written.trim())} is a unit of ${QUANTITIES[other].noun}. ${acceptedUnits(quantity)}`);
}

function acceptedUnits(quantity: Quantity): string {
  const symbols = unitsOf(quantity).map((id) => unitDefinition(quantity, id).symbol);
  const written = symbols.filter((symbol) => symbol !== '');
  const last = written.pop();
  if (last === undefined) return 'Type a plain number, without a unit.';
  const list = written.length > 0 ? `${written.join(', ')} or ${last}` : last;
  return `${capitalised(QUANTITIES[quantity].called)} can be in ${list}${symbols.includes('') ? ', or a plain number' : ''}.`;
}

export function quoted(text: string): string {
  return text.length > SHOWN ? `'${text.slice(0, SHOWN)}…'` : `'${text}'`;
}

function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
