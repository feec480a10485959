import { type NextRequest, NextResponse } from 'next/server';
import { contentSecurityPolicy } from '@/lib/auth/content-security-policy';
import { checkOrigin, originRefusal } from '@/lib/auth/origin';

const plausibleRequestId = /^[A-Za-z0-9._-]{8,64}$/;

/**
 * Runs before every page, action and route but uploads: gives the request an id, refuses a mutation with a cookie from
 * another site, and sends the security headers. Next reads the nonce from the request's own policy header and puts it on
 * the scripts it writes. It decides nothing about permissions: each page, action and route does that itself.
 */
export function proxy(request: NextRequest): Response {
  const offered = request.headers.get('x-request-id') ?? '';
  const requestId = plausibleRequestId.test(offered) ? offered : crypto.randomUUID();
  const origin = checkOrigin(request);
  if (!origin.allowed) {
    const refusal = originRefusal(origin.reason, requestId);
    refusal.headers.set('x-request-id', requestId);
    return refusal;
  }

  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(18))).toString('base64');
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === 'development');
  const forwarded = new Headers(request.headers);
  forwarded.set('x-request-id', requestId);
  forwarded.set('x-nonce', nonce);
  forwarded.set('x-requested-path', request.nextUrl.pathname + request.nextUrl.search);
  forwarded.set('content-security-policy', policy);

  const response = NextResponse.next({ request: { headers: forwarded } });
  response.headers.set('x-request-id', requestId);
  response.headers.set('content-security-policy', policy);
  return response;
}

/**
 * Uploads (`/api/intakes`, `/api/uploads`) stay out, because what passes here is buffered and cut at 10 MB: their handlers
 * call `refuseForeignOrigin` themselves. The headers that are the same for every answer are in next.config.mjs, so that
 * uploads and static files have them too.
 */
export const config = {
  matcher: ['/((?!_next/static|_next/image|api/intakes(?:/|$)|api/uploads(?:/|$)|icon\\.svg$).*)'],
};
