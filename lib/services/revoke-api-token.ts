import { z } from 'zod';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { ApiToken } from '@/models/api-token';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const revokeApiTokenSchema = z.object({ courseId: z.uuid(), tokenId: z.uuid() });

/**
 * Ends a token at once and for good.
 *
 * @throws HalfmarkError `not-found`, `forbidden`
 */
export async function revokeApiToken(
  context: ServiceContext,
  input: z.output<typeof revokeApiTokenSchema>,
): Promise<void> {
  const { transaction, actor, now } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  requireAllowed(decide(actor, 'manage-tokens', course));
  const [revoked] = await ApiToken.update(
    { revokedAt: now },
    { where: { id: input.tokenId, courseId: course.id, revokedAt: null }, transaction },
  );
  if (revoked === 0) throw new HalfmarkError('not-found', 'This token has been revoked already.');
  await recordAuditEvent(context, {
    action: 'revoke-token',
    courseId: course.id,
    subject: { kind: 'api-token', id: input.tokenId },
  });
}
