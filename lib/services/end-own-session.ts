import { z } from 'zod';
import { endSessionsOf } from '@/lib/auth/session-store';
import { HalfmarkError } from '@/lib/errors';
import { requirePerson } from '@/lib/policies/decide';
import { Session } from '@/models/session';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const endOwnSessionSchema = z.object({ reference: z.string().regex(/^[0-9a-f]{12}$/) });

/**
 * Signs one of one's own browsers out, named by its reference in `listOwnSessions`.
 *
 * @throws HalfmarkError `not-found` for a session that has ended or is another person's
 */
export async function endOwnSession(
  context: ServiceContext,
  input: z.output<typeof endOwnSessionSchema>,
): Promise<void> {
  const { userId } = requirePerson(context.actor);
  const { transaction } = context;
  const open = await Session.findAll({ where: { userId }, transaction });
  const found = open.find((session) => session.id.startsWith(input.reference));
  if (found === undefined) throw new HalfmarkError('not-found', 'This session has already ended.');
  await found.destroy({ transaction });
  await recordAuditEvent(context, { action: 'end-session', subject: { kind: 'user', id: userId } });
}

/** Signs every browser of one's own out but the one that asks; returns how many. */
export async function endOwnOtherSessions(context: ServiceContext, input: { sessionId: string }): Promise<number> {
  const { userId } = requirePerson(context.actor);
  const ended = await endSessionsOf(userId, { except: input.sessionId, transaction: context.transaction });
  await recordAuditEvent(context, {
    action: 'end-session',
    subject: { kind: 'user', id: userId },
    details: { sessions: ended },
  });
  return ended;
}
