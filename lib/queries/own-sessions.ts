import { Op } from 'sequelize';
import { Session } from '@/models/session';

/** A browser somewhere that is signed in; `reference` names it without being good for anything else. */
export type OwnSession = { reference: string; since: Date; until: Date; isThis: boolean };

/** The open sessions of a person, the latest first; `currentId` marks the one that asks. */
export async function ownSessions(input: { userId: string; currentId: string; now: Date }): Promise<OwnSession[]> {
  const rows = await Session.findAll({
    where: { userId: input.userId, expiresAt: { [Op.gt]: input.now } },
    order: [['createdAt', 'DESC']],
  });
  return rows.map((row) => ({
    reference: row.id.slice(0, 12),
    since: row.createdAt,
    until: row.expiresAt,
    isThis: row.id === input.currentId,
  }));
}
