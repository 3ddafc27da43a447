import type { MailAtHand } from '@/db/queries/mail';
import { dossierText } from '../dossier/mail';
import { invitationText } from '../invitation/mail';
import { noticesText } from '../notice/mail-text';
import { watchLinkText } from '../watch/link-mail';
import type { Post } from './send';

type Make = (post: Post, mail: MailAtHand) => Promise<string | undefined>;

/** Who makes the text of a kind of mail when it is sent: because it holds a secret, names people, or says where we are reached. */
const MAKERS: Readonly<Record<string, Make>> = { invitation: invitationText, dossier: dossierText, notice: noticesText, 'daily-notices': noticesText, 'watch-link': watchLinkText };

/** @returns undefined when there is nothing to say any more */
export async function textAtSending(post: Post, mail: MailAtHand): Promise<string | undefined> {
  if (mail.body !== null) return mail.body;
  const make = MAKERS[mail.kind];
  if (!make) throw new Error(`Nobody makes the text of mail of the kind ${mail.kind}`);
  return make(post, mail);
}
