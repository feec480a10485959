import { handleTokenRoute } from '@/app/_server/handle-route';
import { problemResponse } from '@/app/_server/problem';
import { readJsonBody } from '@/app/_server/read-json-body';
import { countAttempt } from '@/lib/auth/attempt-limits';
import { type Actor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { checksBodySchema, LONGEST_CHECKS_BODY, MOST_CHECKS } from '@/lib/http-api/check-schemas';
import { checkMany } from '@/lib/jobs/check-many';
import { currentRequestId } from '@/lib/log';
import { canUseCheckBench } from '@/lib/policies/can-use-check-bench';
import { requireAllowed } from '@/lib/policies/decide';

/** Checks answers against references for staff and for programs with a token; never for students. */
export const POST = handleTokenRoute(async ({ request, actor }) => {
  requireAllowed(canUseCheckBench(actor));
  const body = await readJsonBody(request, LONGEST_CHECKS_BODY);
  if (holdsTooMany(body)) {
    throw new HalfmarkError('too-large', `At most ${MOST_CHECKS} checks go in one call. Send the rest in another.`);
  }
  const { checks } = checksBodySchema.parse(body);
  const counted = await countAttempt('checks', callerOf(actor), checks.length);
  if (!counted.allowed) return tooMany(counted.retryAfterSeconds);
  const results = (await checkMany(checks)).map(({ outcome }) => outcome);
  return Response.json({ results }, { headers: { 'cache-control': 'no-store' } });
});

function holdsTooMany(body: unknown): boolean {
  if (typeof body !== 'object' || body === null || !('checks' in body)) return false;
  return Array.isArray(body.checks) && body.checks.length > MOST_CHECKS;
}

function callerOf(actor: Actor): string {
  switch (actor.kind) {
    case 'user':
      return `user ${actor.userId}`;
    case 'token':
      return `token ${actor.tokenId}`;
    case 'system':
      return actor.name;
  }
}

function tooMany(seconds: number): Response {
  const error = new HalfmarkError('too-many', `These are too many checks for now. Try again in ${seconds} seconds.`);
  const response = problemResponse(error, currentRequestId() ?? 'none');
  response.headers.set('retry-after', String(seconds));
  return response;
}
