import type { NoticeKind } from '@/lib/schemas/notice';

/** What a notice says and where it leads, from its row. */
export interface Told {
  kind: NoticeKind;
  caseId: string | null;
  caseNumber: number | null;
  fleetNumber: string | null;
  /** Name of who did it. */
  by: string | null;
  what: string | null;
}

const caseOf = ({ caseNumber, fleetNumber }: Told) => (caseNumber === null ? 'a case' : `case ${caseNumber}, unit ${fleetNumber ?? '?'}`);

const SENTENCES: Readonly<Record<NoticeKind, (told: Told) => string>> = {
  assigned: (told) => (told.by === null ? `You were given ${caseOf(told)}.` : `${told.by} gave you ${caseOf(told)}.`),
  'repair-assigned': (told) => `${told.by === null ? 'You were given a repair' : `${told.by} gave you a repair`} on ${caseOf(told)}${told.what === null ? '' : `: ${told.what}`}.`,
  comeback: (told) => `It came back: the repair of ${caseOf(told)} did not hold${told.what === null ? '' : ` (${told.what})`}.`,
  'watch-due': (told) => `A reading is due that shows whether the repair of ${caseOf(told)} holds${told.what === null ? '' : `: ${told.what}`}.`,
  'mail-bounced': ({ what }) => `A mail could not be delivered${what === null ? '' : `: “${what}”`}.`,
};

/** @example sentenceOf({ kind: 'assigned', by: 'Maud Tierney', caseNumber: 12, fleetNumber: 'K-104', … }) // "Maud Tierney gave you case 12, unit K-104." */
export const sentenceOf = (told: Told): string => SENTENCES[told.kind](told);

const PAGES: Readonly<Partial<Record<NoticeKind, string>>> = { 'repair-assigned': '/repair', 'watch-due': '/watch' };

/** The page of what happened; null: there is none but the notice itself. */
export const placeOf = ({ kind, caseId }: Pick<Told, 'kind' | 'caseId'>): string | null => (caseId === null ? null : `/cases/${caseId}${PAGES[kind] ?? ''}`);

const SUBJECTS: Readonly<Record<NoticeKind, string>> = {
  assigned: 'A case for you',
  'repair-assigned': 'A repair for you',
  comeback: 'A repair did not hold',
  'watch-due': 'A reading is due',
  'mail-bounced': 'A mail could not be delivered',
};

/** Of the mail that tells one notice. It names no person. */
export const subjectOf = ({ kind, caseNumber, fleetNumber }: Pick<Told, 'kind' | 'caseNumber' | 'fleetNumber'>): string =>
  caseNumber === null ? SUBJECTS[kind] : `${SUBJECTS[kind]}: case ${caseNumber}, unit ${fleetNumber ?? '?'}`;
