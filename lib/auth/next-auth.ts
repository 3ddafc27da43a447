import 'server-only';
import { cookies } from 'next/headers';
import { NextRequest, NextResponse } from 'next/server';
import NextAuth from 'next-auth';
import { env } from '@/lib/env';
import { authOptions } from './options';

/**
 * Asks next-auth from a server action, as its own script does from a page, so that signing in needs no script and
 * there is one way in. The cookies that it answers with become those of the action.
 */
async function ask(method: 'GET' | 'POST', path: string[], body?: Record<string, unknown>): Promise<unknown> {
  const request = new NextRequest(new URL(`/api/auth/${path.join('/')}`, env().NEXTAUTH_URL), {
    method,
    ...(body && { headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) }),
  });
  const response: Response = await NextAuth(request, { params: Promise.resolve({ nextauth: path }) }, authOptions());
  const jar = await cookies();
  for (const cookie of new NextResponse(null, { headers: response.headers }).cookies.getAll()) jar.set(cookie);
  return response.json();
}

async function csrfToken(): Promise<string> {
  const answer = await ask('GET', ['csrf']);
  if (typeof answer === 'object' && answer !== null && 'csrfToken' in answer && typeof answer.csrfToken === 'string') return answer.csrfToken;
  throw new Error('next-auth gave no CSRF token');
}

/** A write of next-auth's. It answers a wrong CSRF token, as from a cookie of an old secret, like a success: once more then. */
async function write(path: string[], body: Record<string, unknown>): Promise<URL> {
  for (const _try of [1, 2]) {
    const answer = await ask('POST', path, { ...body, csrfToken: await csrfToken(), json: 'true' });
    const url = typeof answer === 'object' && answer !== null && 'url' in answer && typeof answer.url === 'string' ? answer.url : '/';
    const to = new URL(url, env().NEXTAUTH_URL);
    if (!to.searchParams.has('csrf')) return to;
  }
  throw new Error('next-auth refuses its own CSRF token');
}

/** Signs in; the code of the error when that fails ("invalid", "too-many"). */
export async function beginSession(email: string, password: string): Promise<string | undefined> {
  return (await write(['callback', 'credentials'], { email, password })).searchParams.get('error') ?? undefined;
}

export async function endSession(): Promise<void> {
  await write(['signout'], {});
}

/** Goes on in another organisation; the session's next check finds out whether the person belongs there. */
export async function changeOrganisation(organisationId: string): Promise<void> {
  await ask('POST', ['session'], { csrfToken: await csrfToken(), data: { organisationId } });
}
