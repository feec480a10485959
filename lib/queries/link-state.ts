import { readLink, type LinkPurpose } from '@/lib/auth/link-token';
import { environment } from '@/lib/env';
import { LinkToken } from '@/models/link-token';
import { User } from '@/models/user';

/** Whom a mailed link is for; null where it is not ours, was used, has run out, or its account is deactivated. */
export async function linkState(
  purpose: LinkPurpose,
  token: string,
  now: Date,
): Promise<{ name: string; email: string } | null> {
  const id = readLink(purpose, token, environment().sessionSecret);
  if (id === null) return null;
  const link = await LinkToken.findOne({ where: { id, purpose, usedAt: null } });
  if (link === null || link.expiresAt <= now) return null;
  const user = await User.findOne({ where: { id: link.userId, deactivatedAt: null } });
  return user && { name: user.name, email: user.email };
}
