import type { MailAtHand } from '@/db/queries/mail';
import { invitationText } from '../invitation/mail';
import { watchLinkText } from '../watch/link-mail';
import type { Post } from './send';

/** Who makes the text of a kind of mail when it is sent, because it holds a secret. */
const MAKERS: Readonly<Record<string, (post: Post, mail: MailAtHand) => Promise<string | undefined>>> = { invitation: invitationText, 'watch-link': watchLinkText };

/** @returns undefined when there is nothing to say any more */
export async function textAtSending(post: Post, mail: MailAtHand): Promise<string | undefined> {
  if (mail.body !== null) return mail.body;
  const make = MAKERS[mail.kind];
  if (!make) throw new Error(`Nobody makes the text of mail of the kind ${mail.kind}`);
  return make(post, mail);
}
