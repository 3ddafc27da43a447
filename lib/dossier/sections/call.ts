import { PROOF_WORDS, SURENESS_WORDS } from '@/lib/schemas/call-words';
import type { DossierBlock } from '@/lib/schemas/dossier-content';
import { facts, text } from '../blocks';
import { momentText } from '../moment';
import type { Writer } from '../writer';

export interface CallPart {
  mainCause: string;
  contributingCauses: readonly string[];
  sureness: string;
  proof: string;
  whyNotLeading: string | null;
  unlistedCause: string | null;
  person: string;
  at: Date;
}

/** @param call the one that stands, with the names of its causes; null: none was made, or it was taken back */
export function callSection(call: CallPart | null, { name, timeZone }: Writer): DossierBlock[] {
  if (!call) return text('No cause has been called.');
  return facts(
    ['Cause', call.mainCause],
    ['In other words', call.unlistedCause],
    ['With it', call.contributingCauses.join('; ')],
    ['How sure', SURENESS_WORDS[call.sureness] ?? call.sureness],
    ['How far it is proved', PROOF_WORDS[call.proof] ?? call.proof],
    ['Why not the one that led', call.whyNotLeading],
    ['Called', `${momentText(call.at, timeZone)}, ${name(call.person)}`],
  );
}
