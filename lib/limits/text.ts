import { formatQuantity, type Quantity, type UnitId } from '@/lib/units';
import type { Judgement } from './judge';
import type { Limit } from './limit';

interface Shown {
  quantity: Quantity;
  unit: UnitId;
}

/**
 * A limit in words: "at least 100 psi", "less than 2 psi/min", "100 to 125 psi".
 *
 * @param shown in what to show it; a measure of the check does
 */
export function limitText({ least, most, below }: Pick<Limit, 'least' | 'most' | 'below'>, { quantity, unit }: Shown): string {
  const text = (si: number) => formatQuantity(si, { quantity, unit });
  if (least !== null && most !== null) return `${text(least)} to ${below ? 'less than ' : ''}${text(most)}`;
  if (least !== null) return `at least ${text(least)}`;
  return most === null ? 'no limit' : `${below ? 'less than' : 'at most'} ${text(most)}`;
}

/** A judgement in words: "Out of the limit your organisation adopted, at most 25 s (its source)". */
export function judgementText({ limit, verdict, doubtful }: Judgement, shown: Shown): string {
  const doubt = doubtful ? '; by the error of the reading it could be on either side' : '';
  return `${verdict === 'out' ? 'Out of' : 'Within'} the limit your organisation adopted, ${limitText(limit, shown)} (${limit.source})${doubt}`;
}
