import { NextResponse, type NextRequest } from 'next/server';

/**
 * Gives every page its content security policy with a fresh nonce, and tells it its own path.
 * It lets everybody through: who is asking is checked in each page, action and handler.
 */
export function proxy(request: NextRequest): NextResponse {
  const policy = contentSecurityPolicy(Buffer.from(crypto.randomUUID()).toString('base64'));
  const headers = new Headers(request.headers);
  // Next.js takes the nonce for its own scripts from the request's copy of the policy.
  headers.set('content-security-policy', policy);
  headers.set('x-path', request.nextUrl.pathname + request.nextUrl.search);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  response.headers.set('x-content-type-options', 'nosniff');
  response.headers.set('referrer-policy', 'same-origin');
  return response;
}

function contentSecurityPolicy(nonce: string): string {
  const development = process.env.NODE_ENV === 'development';
  return [
    `default-src 'self'`,
    `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${development ? ` 'unsafe-eval'` : ''}`,
    // The development server injects styles without a nonce.
    development ? `style-src 'self' 'unsafe-inline'` : `style-src 'self' 'nonce-${nonce}'`,
    `style-src-attr 'unsafe-inline'`,
    `img-src 'self' blob: data:`,
    `font-src 'self'`,
    `connect-src 'self'${development ? ' ws:' : ''}`,
    `worker-src 'self' blob:`,
    `object-src 'none'`,
    `base-uri 'self'`,
    `form-action 'self'`,
    `frame-ancestors 'none'`,
  ].join('; ');
}

/** Nothing under /api: a request body that passes through here is cut at 10 MB without a word. */
export const config = { matcher: ['/((?!api/|_next/static|_next/image|favicon.ico).*)'] };
