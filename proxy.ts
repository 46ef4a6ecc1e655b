import { type NextRequest, NextResponse } from 'next/server';

/**
 * Gives every page a content security policy with a fresh nonce. Next reads the nonce from the request's copy of the
 * policy and puts it on its own scripts, so pages must be rendered per request (`await connection()` in the layout).
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = crypto.randomUUID().replaceAll('-', '');
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === 'development');
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('Content-Security-Policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('Content-Security-Policy', policy);
  return response;
}

function contentSecurityPolicy(nonce: string, development: boolean): string {
  return [
    "default-src 'self'",
    // React's development build needs eval for its error stacks; production never does.
    `script-src 'self' 'nonce-${nonce}'${development ? " 'unsafe-eval'" : ''}`,
    `style-src 'self' 'nonce-${nonce}'`,
    // Figures position their marks with style attributes; these cannot run anything.
    "style-src-attr 'unsafe-inline'",
    "worker-src 'self' blob:",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-src 'none'",
    "frame-ancestors 'none'",
  ].join('; ');
}

// Static files and the API carry fixed policies (next.config.ts). Leaving the API out also keeps request bodies whole:
// behind a proxy Next cuts them at 10 MB.
export const config = { matcher: ['/((?!_next/static|_next/image|api/).*)'] };
