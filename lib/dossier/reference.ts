/**
 * What people say aloud of a dossier.
 *
 * @param number counted by the organisation, from 1
 * @param day "YYYY-MM-DD", on which it was made at its site
 * @example dossierReference(12, '2026-03-02') // 'D-2026-00012'
 */
export const dossierReference = (number: number, day: string): string => `D-${day.slice(0, 4)}-${String(number).padStart(5, '0')}`;
