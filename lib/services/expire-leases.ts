import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { ServiceContext } from './context';

/**
 * Puts back every item whose hold has run out: among the escalated where it carries a question, else among the waiting.
 *
 * @returns how many
 */
export async function expireLeases({ transaction, now }: ServiceContext): Promise<number> {
  const rows = await database().query<{ id: string }>(
    `update queue_items
        set state = case when question is null then 'waiting' else 'escalated' end,
            held_by = null, held_until = null, updated_at = :now::timestamptz
      where state = 'taken' and held_until <= :now::timestamptz
      returning id`,
    { type: QueryTypes.SELECT, transaction, replacements: { now: now.toISOString() } },
  );
  return rows.length;
}
