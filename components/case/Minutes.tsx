import { minutesText } from './words';

/** How long something takes. "3 min" is a figure; "under a minute" is words, and stands in their face. */
export function Minutes({ of }: { of: number }) {
  return of < 1 ? minutesText(of) : <span className="figure whitespace-nowrap">{minutesText(of)}</span>;
}
