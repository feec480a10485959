import { z } from 'zod';
import { apiTokenPrefix } from '@/lib/auth/bearer';
import { hashOpaqueToken, newOpaqueToken } from '@/lib/auth/opaque-token';
import { tokenScopes } from '@/lib/domain/token-scopes';
import { decide, requireAllowed, requirePerson } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { ApiToken } from '@/models/api-token';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

const day = 24 * 60 * 60 * 1000;

export const createApiTokenSchema = z.object({
  courseId: z.uuid(),
  name: z.string().trim().min(1, 'Write what it is for.').max(100, 'At most 100 characters.'),
  scopes: z.array(z.enum(tokenScopes), 'Choose at least one use.').min(1, 'Choose at least one use.'),
  days: z.coerce.number('Write a number of days.').int().min(1, 'At least one day.').max(365, 'At most 365 days.'),
});

/**
 * Makes a token for programs, good for one course, some uses and some days. The token itself is in the answer and
 * nowhere else: only its hash is kept.
 *
 * @throws HalfmarkError `not-found`, `forbidden`
 */
export async function createApiToken(
  context: ServiceContext,
  input: z.output<typeof createApiTokenSchema>,
): Promise<{ tokenId: string; token: string; expiresAt: Date }> {
  const { transaction, actor, now } = context;
  const course = await courseForActor(actor, input.courseId, transaction);
  requireAllowed(decide(actor, 'manage-tokens', course));
  const token = apiTokenPrefix + newOpaqueToken();
  const expiresAt = new Date(now.getTime() + input.days * day);
  const made = await ApiToken.create(
    {
      courseId: course.id,
      name: input.name,
      tokenHash: hashOpaqueToken(token),
      scopes: [...new Set(input.scopes)],
      createdBy: requirePerson(actor).userId,
      expiresAt,
      revokedAt: null,
      lastUsedAt: null,
      createdAt: now,
    },
    { transaction },
  );
  await recordAuditEvent(context, {
    action: 'create-token',
    courseId: course.id,
    subject: { kind: 'api-token', id: made.id },
    details: { name: made.name, scopes: made.scopes, expiresAt },
  });
  return { tokenId: made.id, token, expiresAt };
}
