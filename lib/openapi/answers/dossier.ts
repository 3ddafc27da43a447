import { z } from 'zod';
import { DOSSIER_STATES, MAIL_STATES, PAPERS, type DossierRowView, type DossierView } from '@/lib/schemas/dossier';
import { dossierContent } from '@/lib/schemas/dossier-content';
import { id, instant } from './common';

const sending = z.object({
  id,
  to: z.string(),
  words: z.string().nullable(),
  sentBy: z.string(),
  at: instant,
  state: z.enum(MAIL_STATES).meta({ description: '“sent”: the mail server has taken it.' }),
  error: z.string().nullable().meta({ description: 'What went wrong at the last try.' }),
  sentAt: instant.nullable(),
});

const row = z.object({
  id,
  caseId: id,
  reference: z.string().meta({ example: 'D-2026-00012' }),
  madeAt: instant,
  madeBy: z.string(),
  paper: z.enum(PAPERS),
  leftOut: z.array(z.string()).meta({ description: 'What its maker left out, in words.' }),
  state: z.enum(DOSSIER_STATES).meta({ description: 'Of its PDF.' }),
  error: z.string().nullable(),
  bytes: z.int().nullable(),
  pdfHash: z.string().nullable().meta({ description: 'SHA-256 of the PDF, hexadecimal.' }),
  contentHash: z.string().meta({ description: 'SHA-256 of the content in canonical JSON (keys in order, nothing between), hexadecimal.' }),
  sendings: z.array(sending),
}) satisfies z.ZodType<DossierRowView>;

export const dossierList = z.object({ caseId: id, dossiers: z.array(row) }).meta({ id: 'DossierList' });
export const dossierWhole = row
  .extend({ content: dossierContent, isUnchanged: z.boolean().meta({ description: 'Its content still has its hash.' }) })
  .meta({ id: 'Dossier' }) satisfies z.ZodType<DossierView>;
export const dossierMade = z.object({ id, caseId: id, reference: z.string() });
export const dossierSent = z.object({ id, dossierId: id });
export const pdfBytes = z.string().meta({ format: 'binary' });
