import { asTenant } from '@/db/connect';
import { selectSendingOfMail } from '@/db/queries/dossier';
import type { MailAtHand } from '@/db/queries/mail';
import type { Post } from '../mail/send';

/** The text that a dossier goes out with: what its sender wrote, and how anybody can tell that it is unchanged. */
export async function dossierText({ db, baseUrl }: Pick<Post, 'db' | 'baseUrl'>, { organisationId, id: mailId }: MailAtHand): Promise<string | undefined> {
  const sending = await asTenant(db, { organisationId }, (tx) => selectSendingOfMail(tx, { organisationId, mailId }));
  if (!sending) return undefined;
  const { words, reference, contentHash, title, organisation } = sending;
  return `Hello,

${words ?? `${organisation} sends you the dossier ${reference} attached: ${title}.`}

Reference ${reference}
SHA-256 of its content ${contentHash}

Whether the file is unchanged, anybody who has it can find out here, without signing in:

${new URL('/verify', baseUrl).href}

The ranking of causes in it is advice. The makers' information and local rules come first.
`;
}
