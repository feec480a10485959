import 'server-only';
import { randomUUID } from 'node:crypto';
import { cookies } from 'next/headers';
import { actorFromBearer } from '@/lib/auth/bearer';
import { checkOrigin } from '@/lib/auth/origin';
import { type Actor, type PersonActor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { withLogContext } from '@/lib/log';
import { sessionCookie } from '@/lib/auth/session-cookie';
import { currentActor } from './current-actor';
import { asHalfmarkError } from './fail';
import { problemResponse } from './problem';

/** What a handler is given: the request, who sent it, and the address's parameters as strings, not yet validated. */
export type RouteCall<Who extends Actor = PersonActor> = {
  request: Request;
  actor: Who;
  params: Record<string, string>;
  now: Date;
};

/** Next gives a route without parameters in its address none. */
type RouteContext = { params: Promise<Record<string, string | string[] | undefined> | undefined> };
type RouteHandler = (request: Request, context: RouteContext) => Promise<Response>;

/**
 * A route handler for signed-in people: checks the session, and the origin of a mutation (also where the proxy does not
 * run, for uploads), and turns every failure into problem+json (RFC 9457) with the request's id. Schemas may simply throw.
 */
export function handleRoute(handler: (call: RouteCall) => Promise<Response>): RouteHandler {
  return build(async () => {
    const actor = await currentActor();
    if (actor === null) throw new HalfmarkError('signed-out');
    return actor;
  }, handler);
}

/** The same for doors that also take an API token in `Authorization: Bearer`; a token that is not good is refused. */
export function handleTokenRoute(handler: (call: RouteCall<Actor>) => Promise<Response>): RouteHandler {
  return build(async (request) => {
    const bearer = request.headers.has('authorization');
    const actor = bearer ? await actorFromBearer(request) : await currentActor();
    if (actor !== null) return actor;
    throw new HalfmarkError('signed-out', bearer ? 'This token is unknown, has expired or was revoked.' : undefined);
  }, handler);
}

function build<Who extends Actor>(
  whoCalls: (request: Request) => Promise<Who>,
  handler: (call: RouteCall<Who>) => Promise<Response>,
): RouteHandler {
  return async (request, context) => {
    const requestId = request.headers.get('x-request-id') ?? randomUUID();
    return withLogContext({ requestId }, async () => {
      try {
        await refuseForeign(request);
        const actor = await whoCalls(request);
        const response = await handler({ request, actor, params: await plainParams(context), now: new Date() });
        response.headers.set('x-request-id', requestId);
        return response;
      } catch (error) {
        return problemResponse(asHalfmarkError(error), requestId);
      }
    });
  };
}

/** A mutation is refused when our own session cookie came with it from elsewhere; callers with a token have no cookie. */
async function refuseForeign(request: Request): Promise<void> {
  const hasSession = (await cookies()).has(sessionCookie().name);
  const origin = hasSession ? checkOrigin(request) : ({ allowed: true } as const);
  if (!origin.allowed) throw new HalfmarkError('cross-origin', undefined, { log: origin.reason });
}

async function plainParams(context: RouteContext): Promise<Record<string, string>> {
  const entries = Object.entries((await context.params) ?? {}).map(([name, value]) => [name, [value].flat().join('/')]);
  return Object.fromEntries(entries) as Record<string, string>;
}
