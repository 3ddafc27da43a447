import type { Mail } from '@/lib/mail';
import type { Post } from '@/lib/services/password/mail-reset';
import type { TestDatabases } from './context';

/** What the jobs that mail links need, with a mailer that keeps what it is given. */
export function makePost(databases: TestDatabases, now: () => Date = () => new Date()): { post: Post; letters: Mail[]; tokenOf: (letter: Mail | undefined) => string } {
  const letters: Mail[] = [];
  return {
    letters,
    post: {
      db: databases.app,
      now,
      baseUrl: 'https://carryover.test',
      mailer: { send: async (mail) => void letters.push(mail), close: () => undefined },
    },
    tokenOf(letter) {
      const token = /https:\/\/carryover\.test\/(?:invite|reset-password)\/(\S+)/.exec(letter?.text ?? '')?.[1];
      if (!token) throw new Error(`No link in the letter: ${letter?.text}`);
      return token;
    },
  };
}
