import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { facts } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface ComplaintPart {
  /** Names of the coded complaints. */
  complaints: readonly string[];
  words: string | null;
  openedAt: Date;
  openedBy: string;
}

export const complaintSection = ({ complaints, words, openedAt, openedBy }: ComplaintPart, { name, timeZone }: Writer): DossierBlock[] =>
  facts(['Complaint', complaints.join('; ')], ['In the driver’s words, as taken down', words], ['Opened', `${momentText(openedAt, timeZone)}, ${name(openedBy)}`]);
