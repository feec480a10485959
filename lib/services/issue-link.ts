import { linkLifetimeHours, type LinkPurpose } from '@/lib/auth/link-token';
import { enqueue } from '@/lib/queue/enqueue';
import { LinkToken } from '@/models/link-token';
import { type ServiceContext } from './context';

const hour = 60 * 60 * 1000;

/**
 * Makes a link that lets a person set their password and has it mailed once the transaction commits. An older open link
 * for the same purpose stops working, so that only the latest mail counts. For other services; it authorises nothing.
 */
export async function issueLink(context: ServiceContext, userId: string, purpose: LinkPurpose): Promise<void> {
  const { actor, now, transaction } = context;
  await LinkToken.update({ usedAt: now }, { where: { userId, purpose, usedAt: null }, transaction });
  const link = await LinkToken.create(
    {
      userId,
      purpose,
      expiresAt: new Date(now.getTime() + linkLifetimeHours[purpose] * hour),
      usedAt: null,
      createdBy: actor.kind === 'user' ? actor.userId : null,
      createdAt: now,
    },
    { transaction },
  );
  await enqueue('send-account-mail', { linkTokenId: link.id }, { transaction });
}
