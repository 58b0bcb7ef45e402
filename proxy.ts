import { type NextRequest, NextResponse } from 'next/server';

const policy = (nonce: string) =>
  [
    "default-src 'none'",
    `script-src 'nonce-${nonce}' 'strict-dynamic'${process.env.NODE_ENV === 'development' ? " 'unsafe-eval'" : ''}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' blob: data:",
    "font-src 'self'",
    "connect-src 'self'",
    "worker-src 'self'",
    "manifest-src 'self'",
    "frame-ancestors 'none'",
    "base-uri 'none'",
    "form-action 'self'",
  ].join('; ');

/**
 * Headers of every page, and nothing that decides: a nonce for its scripts, its own path for coming back after signing in.
 * Taking this file away changes no permission.
 */
export function proxy(request: NextRequest) {
  const nonce = btoa(String.fromCharCode(...crypto.getRandomValues(new Uint8Array(16))));
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('x-ruckle-path', request.nextUrl.pathname + request.nextUrl.search);
  headers.set('content-security-policy', policy(nonce));
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy(nonce));
  return response;
}

/** Pages only: uploads above 10 MB would be cut short in here without a word, and static files need none of it. */
export const config = {
  matcher: [{ source: '/((?!api/|_next/|favicon.ico).*)' }],
};
