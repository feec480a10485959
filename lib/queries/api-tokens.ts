import { type TokenScope } from '@/lib/domain/token-scopes';
import { ApiToken } from '@/models/api-token';
import { User } from '@/models/user';

/** A token as its list shows it, without anything it could be used by. */
export type TokenInList = {
  id: string;
  name: string;
  scopes: TokenScope[];
  madeBy: string;
  createdAt: Date;
  expiresAt: Date;
  lastUsedAt: Date | null;
  state: 'good' | 'expired' | 'revoked';
};

/** The tokens of a course, the latest first. */
export async function apiTokensOf(courseId: string, now: Date): Promise<TokenInList[]> {
  const rows = await ApiToken.findAll({
    where: { courseId },
    include: [{ model: User, as: 'creator', attributes: ['name'] }],
    order: [['createdAt', 'DESC']],
  });
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    scopes: row.scopes as TokenScope[],
    madeBy: row.creator?.name ?? '',
    createdAt: row.createdAt,
    expiresAt: row.expiresAt,
    lastUsedAt: row.lastUsedAt,
    state: row.revokedAt !== null ? 'revoked' : row.expiresAt <= now ? 'expired' : 'good',
  }));
}
