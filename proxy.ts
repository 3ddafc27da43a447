import { NextResponse, type NextRequest } from 'next/server';

/**
 * The content security policy of one response. Scripts and style sheets need this response's nonce;
 * React's `style={}` needs style attributes. The development server evaluates code, opens a socket and
 * injects styles without a nonce. Photos go straight to the storage.
 */
export function contentSecurityPolicy(nonce: string, development: boolean, storage = process.env.S3_ENDPOINT): string {
  const directives: Record<string, string> = {
    'default-src': "'self'",
    'script-src': `'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    'style-src': development ? "'self' 'unsafe-inline'" : `'self' 'nonce-${nonce}'`,
    'style-src-attr': "'unsafe-inline'",
    'img-src': "'self' data: blob:",
    'font-src': "'self'",
    'connect-src': `'self'${storage ? ` ${new URL(storage).origin}` : ''}${development ? ' ws:' : ''}`,
    'worker-src': "'self'",
    'object-src': "'none'",
    'base-uri': "'none'",
    'form-action': "'self'",
    'frame-ancestors': "'none'",
  };
  return Object.entries(directives)
    .map(([name, value]) => `${name} ${value}`)
    .join('; ');
}

const securityHeaders: Record<string, string> = {
  'Referrer-Policy': 'same-origin',
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Cross-Origin-Opener-Policy': 'same-origin',
  // The camera photographs findings; nothing else of the device is needed.
  'Permissions-Policy': 'camera=(self), microphone=(), geolocation=(), payment=(), usb=()',
};

/** Gives every page its own nonce (Next reads it from the request's policy) and every answer its headers. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = btoa(crypto.randomUUID());
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === 'development');

  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  // Where to come back to after signing in; a layout can't know its address.
  headers.set('x-path', request.nextUrl.pathname + request.nextUrl.search);
  headers.set('Content-Security-Policy', policy);

  const response = NextResponse.next({ request: { headers } });
  response.headers.set('Content-Security-Policy', policy);
  for (const [name, value] of Object.entries(securityHeaders)) response.headers.set(name, value);
  return response;
}

export const config = {
  // Built files carry their own hash and need no policy.
  matcher: '/((?!_next/static|_next/image).*)',
};
