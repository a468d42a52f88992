import { type NextRequest, NextResponse } from 'next/server';

/**
 * Sets headers and decides nothing: who may see a page is asked again by every page, action and handler.
 * A request that claims to be a prefetch gets the same headers as any other.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64');
  const policy = contentPolicy(nonce, process.env.NODE_ENV === 'development');

  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('Content-Security-Policy', policy);
  response.headers.set('Cache-Control', 'private, no-store');
  return response;
}

/** Attributes keep their inline styles, since a server-rendered style="" can carry no nonce. */
export function contentPolicy(nonce: string, isDevelopment: boolean): string {
  const scripts = `'self' 'nonce-${nonce}' 'strict-dynamic'`;
  return [
    "default-src 'self'",
    isDevelopment ? `script-src ${scripts} 'unsafe-eval'` : `script-src ${scripts}`,
    isDevelopment ? "style-src 'self' 'unsafe-inline'" : `style-src 'self' 'nonce-${nonce}'`,
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    isDevelopment ? "connect-src 'self' ws:" : "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}

export const config = {
  matcher: ['/((?!embed/|oembed$|oembed/|_next/static|fonts/|readme/|favicon).*)'],
};
