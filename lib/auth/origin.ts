import { errorTable } from '@/lib/errors';

/** What the Origin check needs of a request; `Request` and `NextRequest` both fit. */
export interface OriginRequest {
  readonly method: string;
  readonly headers: Pick<Headers, 'get'>;
}

export type OriginDecision = { readonly allowed: true } | { readonly allowed: false; readonly reason: string };

const safeMethods = new Set(['GET', 'HEAD', 'OPTIONS']);
const loopbackHosts = new Set(['localhost', '127.0.0.1', '[::1]']);
const allowed: OriginDecision = { allowed: true };

/**
 * Decides whether a request may change something with the cookie it bears. A browser sends `Origin` with every mutation,
 * so a request with a cookie and without an Origin of ours was made by another site (or by a script, which has tokens).
 *
 * Ours is the origin of `appUrl`; while that is missing or on loopback, also the host the request was sent to, because a
 * developer opens the same server as localhost, 127.0.0.1 and under a forwarded port.
 *
 * @param request the request; its body is not touched
 * @param appUrl the public address of the product, by default the environment's `APP_URL`
 */
export function checkOrigin(request: OriginRequest, appUrl = process.env.APP_URL): OriginDecision {
  if (safeMethods.has(request.method.toUpperCase())) return allowed;
  if (!request.headers.get('cookie')) return allowed;
  const origin = parseUrl(request.headers.get('origin'));
  if (!origin) {
    return {
      allowed: false,
      reason: 'The request changes something with a cookie but does not say where it came from.',
    };
  }
  const own = parseUrl(appUrl);
  if (own && origin.origin === own.origin) return allowed;
  const hostCounts = !own || loopbackHosts.has(own.hostname);
  if (hostCounts && origin.host === request.headers.get('host')) return allowed;
  return { allowed: false, reason: `The request came from ${origin.origin}, which is not this site.` };
}

/**
 * The answer to a refused request: 403 as problem+json (RFC 9457). The reason names origins only, never data.
 */
export function originRefusal(reason: string, requestId?: string): Response {
  const problem = {
    type: 'about:blank',
    title: errorTable['cross-origin'].message,
    status: errorTable['cross-origin'].status,
    code: 'cross-origin',
    detail: `${reason} Open the page again from the address you usually use and repeat the action.`,
    ...(requestId ? { requestId } : {}),
  };
  return new Response(JSON.stringify(problem), {
    status: problem.status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' },
  });
}

/**
 * For a route handler that the proxy leaves alone because it streams its body (uploads): the refusal to return at once,
 * or null when the request may go on.
 */
export function refuseForeignOrigin(request: OriginRequest, appUrl = process.env.APP_URL): Response | null {
  const decision = checkOrigin(request, appUrl);
  return decision.allowed ? null : originRefusal(decision.reason);
}

function parseUrl(value: string | null | undefined): URL | null {
  return value && URL.canParse(value) ? new URL(value) : null;
}
