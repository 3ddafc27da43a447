import { eq } from 'drizzle-orm';
import { asTenant } from '@/db/connect';
import { mail } from '@/db/schema';
import type { Mail } from '@/lib/mail';
import { sendMail, type Post } from '@/lib/services/mail/send';
import { noStorage } from '@/lib/storage/none';
import type { TestDatabases } from './context';

interface TestPost {
  post: Post;
  letters: Mail[];
  tokenOf: (letter: Mail | undefined) => string;
  /** Sends what waits in an organisation's outbox. */
  deliver: (organisationId: string) => Promise<void>;
}

/** What the jobs that mail need, with a mailer that keeps what it is given. */
export function makePost({ app }: Pick<TestDatabases, 'app'>, now: () => Date = () => new Date()): TestPost {
  const letters: Mail[] = [];
  const post: Post = {
    db: app,
    now,
    baseUrl: 'https://carryover.test',
    secret: 'a secret for tests alone',
    storage: noStorage,
    mailer: { send: async (letter) => void letters.push(letter), close: () => undefined },
  };
  return {
    letters,
    post,
    async deliver(organisationId) {
      const waiting = await asTenant(app, { organisationId }, (tx) => tx.select({ id: mail.id }).from(mail).where(eq(mail.state, 'waiting')).orderBy(mail.createdAt));
      for (const { id } of waiting) await sendMail(post, { organisationId, mailId: id }, { isLast: false });
    },
    tokenOf(letter) {
      const token = /https:\/\/carryover\.test\/(?:invite|reset-password)\/(\S+)/.exec(letter?.text ?? '')?.[1];
      if (!token) throw new Error(`No link in the letter: ${letter?.text}`);
      return token;
    },
  };
}
