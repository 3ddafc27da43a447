import { z } from 'zod';
import { checkbox, email, optionalLine, rowId, several } from './common';
import { DOSSIER_SECTION_IDS, type DossierContent } from './dossier-content';

export const PAPERS = ['a4', 'letter'] as const;
export type Paper = (typeof PAPERS)[number];

export const DOSSIER_STATES = ['waiting', 'made', 'failed'] as const;
export type DossierState = (typeof DOSSIER_STATES)[number];

/** More can't be set within the time that a job has. */
export const MOST_DOSSIER_PHOTOS = 120;

export const dossiersOfCaseInput = z.strictObject({ caseId: rowId });
export const dossierInput = z.strictObject({ caseId: rowId, dossierId: rowId });

export const makeDossierInput = z.strictObject({
  id: rowId,
  caseId: rowId,
  paper: z.enum(PAPERS, 'Choose the paper.'),
  leaveOut: several(z.enum(DOSSIER_SECTION_IDS)).default([]),
  leaveOutPhotos: z.preprocess((value) => (value === undefined ? [] : [value].flat()), z.array(rowId).max(1000)).default([]),
  /** Technicians are numbered instead. */
  withholdNames: checkbox,
  withholdFleet: checkbox,
});

export const sendDossierInput = z.strictObject({ id: rowId, caseId: rowId, dossierId: rowId, to: email, words: optionalLine(2000) });
export const sendingInput = z.strictObject({ caseId: rowId, dossierId: rowId, sendingId: rowId });

export const verifyDossierInput = z.strictObject({
  reference: z.string('Enter the reference.').trim().toUpperCase().regex(/^D-\d{4}-\d{5,9}$/, 'A reference looks like D-2026-00012.'),
  hash: z.string('Enter the hash.').trim().toLowerCase().regex(/^[0-9a-f]{64}$/, 'A hash has 64 digits and letters from a to f. Choose the file instead, and it is worked out.'),
});

export const MAIL_STATES = ['waiting', 'sent', 'given-up'] as const;

/** Where a mail stands that took a dossier to somebody. */
export interface SendingView {
  id: string;
  to: string;
  words: string | null;
  sentBy: string;
  at: string;
  state: (typeof MAIL_STATES)[number];
  /** What the server said when it wouldn't take it. */
  error: string | null;
  sentAt: string | null;
}

export interface DossierRowView {
  id: string;
  caseId: string;
  reference: string;
  madeAt: string;
  madeBy: string;
  paper: Paper;
  /** In words. */
  leftOut: string[];
  state: DossierState;
  error: string | null;
  /** Of the PDF; null until it is made. */
  bytes: number | null;
  pdfHash: string | null;
  contentHash: string;
  sendings: SendingView[];
}

export interface DossierView extends DossierRowView {
  content: DossierContent;
  /** Its content still has the hash that it was made with. */
  isUnchanged: boolean;
}
