import 'server-only';
import type { NextAuthOptions, Session } from 'next-auth';
import type { JWT } from 'next-auth/jwt';
import CredentialsProvider from 'next-auth/providers/credentials';
import { database } from '@/db';
import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import { signIn } from '@/lib/services/session/sign-in';
import { standingOf, type Standing } from '@/lib/services/session/standing';
import { visitorFrom } from './visitor';

declare module 'next-auth' {
  interface Session {
    standing?: Standing;
    /** It could not be looked up: that is no sign-out. */
    failure?: Error;
  }
  interface User {
    sessionVersion: number;
    organisationId: string;
  }
}
declare module 'next-auth/jwt' {
  interface JWT {
    sub?: string;
    organisationId: string;
    sessionVersion: number;
  }
}

const A_WEEK_S = 7 * 24 * 3600;

/** What the jwt callback read from the database, for the session callback of the same request. Never in the cookie. */
const lookedUp = new WeakMap<JWT, Standing | Error>();

class SignedOut extends Error {}

/** next-auth takes anything thrown for a sign-out, so that a database out of reach has to be handed on instead. */
async function lookUp(...given: Parameters<typeof standingOf>): Promise<Standing | Error | undefined> {
  try {
    return await standingOf(...given);
  } catch (error) {
    return error instanceof Error ? error : new Error(String(error));
  }
}

/** The organisation to go on in, when a signed-in person asks for another; his membership is checked like any. */
const organisationAsked = (session: unknown): string | undefined => {
  const asked = typeof session === 'object' && session !== null && 'organisationId' in session ? session.organisationId : undefined;
  return typeof asked === 'string' && /^[0-9a-f-]{36}$/.test(asked) ? asked : undefined;
};

/** Made at each request, because the build has no environment. */
export const authOptions = (): NextAuthOptions => ({
  secret: env().NEXTAUTH_SECRET,
  useSecureCookies: env().NEXTAUTH_URL.startsWith('https:'),
  session: { strategy: 'jwt', maxAge: A_WEEK_S },
  pages: { signIn: '/sign-in', signOut: '/sign-in', error: '/sign-in' },
  logger: {
    // A cookie of somebody who was signed out is no error of ours.
    error: (code, metadata) => (code === 'JWT_SESSION_ERROR' ? log.info({ code }, 'session ended') : log.error({ code, metadata }, 'next-auth')),
    warn: (code) => log.warn({ code }, 'next-auth'),
    debug: () => undefined,
  },
  providers: [
    CredentialsProvider({
      credentials: { email: { type: 'email' }, password: { type: 'password' } },
      async authorize(credentials, request) {
        const headers = new Headers(Object.entries(request.headers ?? {}).map(([name, value]): [string, string] => [name, String(value)]));
        try {
          const input = { email: credentials?.email ?? '', password: credentials?.password ?? '' };
          const { personId, ...rest } = await signIn({ visitor: visitorFrom(headers), input });
          return { id: personId, ...rest };
        } catch (error) {
          // next-auth puts the message into an address: only the code goes there.
          if (error instanceof AppError) throw new Error(error.code);
          log.error({ err: error }, 'sign-in failed');
          throw new Error('unknown');
        }
      },
    }),
  ],
  callbacks: {
    async jwt({ token, user, trigger, session }) {
      if (user) return { sub: user.id, organisationId: user.organisationId, sessionVersion: user.sessionVersion };
      const organisationId = (trigger === 'update' && organisationAsked(session)) || token.organisationId;
      const found = token.sub && (await lookUp(database(), { personId: token.sub, organisationId, sessionVersion: token.sessionVersion }));
      // Thrown, not returned: next-auth then clears the cookie.
      if (!found) throw new SignedOut();
      const next = { ...token, organisationId };
      lookedUp.set(next, found);
      return next;
    },
    session({ session, token }): Session {
      const found = lookedUp.get(token);
      return { expires: session.expires, ...(found instanceof Error ? { failure: found } : { standing: found }) };
    },
  },
});
