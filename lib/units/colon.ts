import { readNumber, type DecimalMark } from './number';
import { QUANTITIES, isUnitOf, type Quantity, type UnitOf } from './quantities';
import { refuse, refuseUnknown, type RefusedQuantity } from './refusal';
import { isBlankUnit, unitSpelt } from './spelling';

/** A value in one of the quantity's units. */
export interface Term<Q extends Quantity> {
  readonly ok: true;
  readonly value: number;
  readonly unit: UnitOf<Q>;
}

interface ColonOptions<Q extends Quantity> {
  readonly quantity: Q;
  readonly defaultUnit: UnitOf<Q>;
  readonly decimal?: DecimalMark;
}

const CLOCK = /^(\d{1,4}):(\d{2})(?::(\d{2}))?(?:[.,](\d{1,3}))?(?!\d) ?(.*)$/;

/**
 * Reads a time as a clock writes it, or a ratio: "1:30" is 90 s, "1:02:30" an hour, two minutes and thirty seconds,
 * "1:30 h" ninety minutes, "1.5:1" one and a half. Undefined when there is no colon or it means nothing here.
 */
export function readColon<Q extends Quantity>(body: string, asTyped: string, options: ColonOptions<Q>): Term<Q> | RefusedQuantity | undefined {
  const { colon } = QUANTITIES[options.quantity];
  if (!body.includes(':') || colon === undefined) return undefined;
  return colon === 'clock' ? readClock(body, asTyped, options) : readRatio(body, asTyped, options);
}

function readClock<Q extends Quantity>(body: string, asTyped: string, { quantity, defaultUnit }: ColonOptions<Q>): Term<Q> | RefusedQuantity {
  const unknown = refuseUnknown(asTyped, quantity);
  const [, first, second, third, decimals, suffix = ''] = CLOCK.exec(body) ?? [];
  if (first === undefined || second === undefined) return unknown;
  if (Number(second) >= 60 || Number(third ?? 0) >= 60) return refuse(`'${asTyped}' has 60 or more after a colon. Try 1:30 or 90 s.`);

  const part = (text: string) => Number(`${text}.${decimals ?? 0}`);
  if (third !== undefined) {
    return isBlankUnit(suffix) ? term(Number(first) * 3600 + Number(second) * 60 + part(third), quantity, 's', unknown) : unknown;
  }
  // A person who thinks in hours may mean hours and minutes.
  const meant = isBlankUnit(suffix) ? defaultUnit : unitSpelt(quantity, suffix);
  if (meant === 's' || meant === 'min') return term(Number(first) * 60 + part(second), quantity, 's', unknown);
  if (isBlankUnit(suffix)) {
    return refuse(`'${asTyped}' can be read as minutes and seconds or as hours and minutes. Please write ${asTyped} min or ${asTyped} h.`);
  }
  if (meant === 'h') return term(Number(first) * 60 + part(second), quantity, 'min', unknown);
  return unknown;
}

function readRatio<Q extends Quantity>(body: string, asTyped: string, { quantity, decimal }: ColonOptions<Q>): Term<Q> | RefusedQuantity {
  const unknown = refuseUnknown(asTyped, quantity);
  const [over = '', under = '', ...more] = body.split(':').map((side) => side.trim());
  const [a, b] = [readNumber(over, { decimal }), readNumber(under, { decimal })];
  if (!a.ok || !b.ok || a.rest !== '' || b.rest !== '' || more.length > 0) return unknown;
  if (b.value === 0) return refuse(`'${asTyped}' divides by zero.`);
  return term(a.value / b.value, quantity, 'one', unknown);
}

function term<Q extends Quantity>(value: number, quantity: Q, unit: string, otherwise: RefusedQuantity): Term<Q> | RefusedQuantity {
  return isUnitOf(quantity, unit) ? { ok: true, value, unit } : otherwise;
}
