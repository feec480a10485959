import { Op, type Transaction } from 'sequelize';
import { Session } from '@/models/session';
import { hashOpaqueToken, newOpaqueToken } from './opaque-token';

const day = 24 * 60 * 60 * 1000;

/** A session ends when it has not been used for this long, and in any case after `longest`. */
export const sessionLifetime = { idle: 7 * day, longest: 30 * day } as const;

/** A session as the service knows it: `id` is the hash of the token, which itself is stored nowhere. */
export type OpenSession = { id: string; userId: string; createdAt: Date; expiresAt: Date };

/** Opens a session for a person; the token returned goes into the cookie and is not kept. */
export async function startSession(userId: string, now: Date, transaction?: Transaction): Promise<string> {
  const token = newOpaqueToken();
  const expiresAt = new Date(now.getTime() + sessionLifetime.idle);
  await Session.create({ id: hashOpaqueToken(token), userId, createdAt: now, expiresAt }, { transaction });
  await Session.destroy({ where: { userId, expiresAt: { [Op.lte]: now } }, transaction });
  return token;
}

/** The open session of a token, kept alive by being read; null when there is none or it has run out. */
export async function readSession(token: string, now: Date): Promise<OpenSession | null> {
  const row = await Session.findOne({ where: { id: hashOpaqueToken(token), expiresAt: { [Op.gt]: now } } });
  if (row === null) return null;
  const end = Math.min(now.getTime() + sessionLifetime.idle, row.createdAt.getTime() + sessionLifetime.longest);
  // Once a day is enough: a write for every request would be paid by every page.
  if (end - row.expiresAt.getTime() > day) {
    await Session.update({ expiresAt: new Date(end) }, { where: { id: row.id } });
    row.expiresAt = new Date(end);
  }
  return { id: row.id, userId: row.userId, createdAt: row.createdAt, expiresAt: row.expiresAt };
}

/** Ends the session of a token: signing out. */
export async function endSession(token: string): Promise<void> {
  await Session.destroy({ where: { id: hashOpaqueToken(token) } });
}

/** Ends every session of a person, but the one with id `except` where given; returns how many ended. */
export async function endSessionsOf(
  userId: string,
  options: { except?: string; transaction: Transaction },
): Promise<number> {
  const kept = options.except === undefined ? {} : { id: { [Op.ne]: options.except } };
  return Session.destroy({ where: { userId, ...kept }, transaction: options.transaction });
}
