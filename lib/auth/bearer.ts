import 'server-only';
import { database } from '@/db';
import { AppError, notSignedIn, type ErrorCode } from '@/lib/errors';
import type { Ctx } from '@/lib/services/context';
import { standingOfToken, type TokenStanding } from '@/lib/services/token/standing';
import type { Scope } from './scopes';
import { contextOf, getContext } from './session';
import { holdsPersonalToken } from './token';

/** A refusal that says by RFC 6750 what a token would have to be. */
export class TokenRefused extends AppError {
  constructor(
    code: ErrorCode,
    message: string,
    readonly challenge: Readonly<Record<string, string>> = {},
  ) {
    super(code, message);
  }
}

/** Names under which scripts put a token into an address. */
const IN_ADDRESS = ['access_token', 'api_token', 'token', 'bearer'];

const WHY_NOT: Record<Extract<TokenStanding, { works: false }>['why'], string> = {
  unknown: 'There is no such token. Check that it was copied whole.',
  revoked: 'This token was revoked. Make a new one under Settings, Tokens.',
  expired: 'This token has expired. Make a new one under Settings, Tokens.',
  left: 'The person whose token this is does not work in this organisation any more.',
};

/** Who asks: by a token when the request has one, else by its session's cookie. Scopes bind tokens alone. */
export interface Caller {
  ctx: Ctx;
  token: { scopes: readonly Scope[] } | null;
}

/** @throws AppError "not-signed-in" */
export async function callerOf(request: Request): Promise<Caller> {
  refuseTokenInAddress(request);
  const authorization = request.headers.get('authorization');
  if (authorization === null) {
    const ctx = await getContext();
    if (!ctx) throw notSignedIn();
    return { ctx, token: null };
  }
  const [, token] = /^Bearer +([\w.~+/=-]{1,200})$/i.exec(authorization) ?? [];
  if (token === undefined) throw new TokenRefused('not-signed-in', 'Send the token as “Authorization: Bearer” and the token after it.');
  const found = await standingOfToken(database(), { token, now: new Date() });
  if (!found.works) throw new TokenRefused('not-signed-in', WHY_NOT[found.why], { error: 'invalid_token' });
  return { ctx: contextOf(found.standing), token: { scopes: found.scopes } };
}

/** Addresses end up in logs, histories and on screens. */
function refuseTokenInAddress({ url }: Request): void {
  const { pathname, searchParams } = new URL(url);
  if (!IN_ADDRESS.some((name) => searchParams.has(name)) && !holdsPersonalToken(`${pathname} ${searchParams}`)) return;
  throw new TokenRefused('not-signed-in', 'A token does not belong in an address, where logs keep it: send it in the Authorization header. Revoke this one and make another.');
}

/** @throws AppError "forbidden" when the request came by a token that lacks the scope */
export function refuseMissingScope({ token }: Caller, scope: Scope | undefined): void {
  if (token === null) return;
  if (scope === undefined) throw new TokenRefused('forbidden', 'A token cannot do this; it is for the pages of the application alone.', { error: 'insufficient_scope' });
  if (token.scopes.includes(scope)) return;
  throw new TokenRefused('forbidden', `This token lacks the scope “${scope}”. Make one that has it under Settings, Tokens.`, { error: 'insufficient_scope', scope });
}
