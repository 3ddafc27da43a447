import 'server-only';
import { notFound, redirect } from 'next/navigation';
import { AppError } from '@/lib/errors';
import type { Ctx } from '@/lib/services/context';
import { ANYONE, hasAnyRole, type Role } from './roles';
import { requireContext } from './session';

/**
 * What a page begins with. Not signed in: to the sign-in, and back here afterwards. Wrong role: to a page that says
 * so. What a page reads is refused by its service as well; this makes the refusal readable.
 *
 * @example const ctx = await pageContext(PERMITTED['people.manage']);
 */
export async function pageContext(roles: readonly Role[] = ANYONE): Promise<Ctx> {
  const ctx = await requireContext();
  if (!hasAnyRole(ctx.roles, roles)) redirect('/not-allowed');
  return ctx;
}

/** For what a page reads by an id in its address: what isn't there, and what is no id at all, is the not-found page. */
export async function orNotFound<T>(work: Promise<T>): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (error instanceof AppError && (error.code === 'not-found' || error.code === 'invalid')) notFound();
    throw error;
  }
}

/** For the page of a mailed link: what it opens, or the sentence that says why it leads nowhere. */
export async function unlessDead<T>(work: Promise<T>): Promise<{ ok: true; result: T } | { ok: false; message: string }> {
  try {
    return { ok: true, result: await work };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return { ok: false, message: error.fields.token ?? error.message };
  }
}
