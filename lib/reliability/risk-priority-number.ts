/**
 * Severity x occurrence x detection, each from 1 to 10. A way to sort a list, not a measure: 8 x 4 x 5 is not twice as
 * bad as 8 x 4 x 2.5.
 *
 * @throws RangeError
 * @see IEC 60812
 * @example riskPriorityNumber({ severity: 8, occurrence: 4, detection: 5 }) // 160
 */
export function riskPriorityNumber({ severity, occurrence, detection }: { severity: number; occurrence: number; detection: number }): number {
  if (![severity, occurrence, detection].every((grade) => grade >= 1 && grade <= 10)) throw new RangeError('A grade is from 1 to 10.');
  return severity * occurrence * detection;
}
