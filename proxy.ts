import { NextResponse, type NextRequest } from 'next/server';

/**
 * Every page is rendered under a policy of its own: only scripts that carry its nonce run, so that
 * text which got into a page can't.
 */
export function contentSecurityPolicy(nonce: string, { development = false, tls = false } = {}) {
  return [
    "default-src 'none'",
    // React's development build turns server errors back into stacks by eval; the real one never does.
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? " 'unsafe-eval'" : ''}`,
    // Leaflet, Konva and React place things by style attributes, which can't carry a nonce.
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${development ? ' ws:' : ''}`,
    "worker-src 'self' blob:",
    "manifest-src 'self'",
    "form-action 'self'",
    "base-uri 'none'",
    "frame-ancestors 'none'",
    ...(tls ? ['upgrade-insecure-requests'] : []),
  ].join('; ');
}

export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64');
  const policy = contentSecurityPolicy(nonce, {
    development: process.env.NODE_ENV === 'development',
    tls: request.headers.get('x-forwarded-proto') === 'https',
  });
  // Next reads the nonce for its own scripts out of the request's policy.
  const headers = new Headers(request.headers);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  return response;
}

export const config = {
  /**
   * Pages only. What passes through here is cut at ten megabytes, so the routes that take files
   * stay out, and tiles gain nothing from it; next.config.ts gives both a policy that allows nothing.
   */
  matcher: ['/((?!api/|tiles/|_next/static/|_next/image).*)'],
};
