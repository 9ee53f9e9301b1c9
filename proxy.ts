import { NextResponse, type NextRequest } from 'next/server';

/** Gives every request an id, and every page a content security policy with a nonce of its own. */
export function proxy(request: NextRequest): NextResponse {
  const headers = new Headers(request.headers);
  const requestId = crypto.randomUUID();
  headers.set('x-request-id', requestId);

  if (request.nextUrl.pathname.startsWith('/api/')) {
    const response = NextResponse.next({ request: { headers } });
    response.headers.set('x-request-id', requestId);
    return response;
  }

  const nonce = btoa(crypto.randomUUID());
  const policy = writePolicy(nonce);
  headers.set('x-nonce', nonce);
  // A layout isn't told which page it frames, and must send a stranger to sign in and back to that page.
  headers.set('x-raglan-path', request.nextUrl.pathname + request.nextUrl.search);
  // Next takes the nonce for its own script and style tags from the policy on the request, not from x-nonce.
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  response.headers.set('x-request-id', requestId);
  return response;
}

function writePolicy(nonce: string): string {
  // eslint-disable-next-line no-restricted-properties -- the bundler replaces it; lib/platform/env.ts is for settings.
  const dev = process.env.NODE_ENV === 'development';
  return [
    "default-src 'self'",
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${dev ? " 'unsafe-eval'" : ''}`,
    // Hot reload puts style tags in without a nonce, and a nonce would switch 'unsafe-inline' off again.
    `style-src 'self' ${dev ? "'unsafe-inline'" : `'nonce-${nonce}'`}`,
    // Team colours are data, so they reach the page as style attributes.
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self' blob:",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}

// Prefetches are not left out: whoever adds a check here must not be walked around with a header.
export const config = {
  matcher: ['/((?!_next/static|_next/image|fonts/|samples/|icon\\.svg|favicon\\.ico).*)'],
};
