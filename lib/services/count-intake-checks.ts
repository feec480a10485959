import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { ServiceContext } from './context';

/**
 * Brings the counts of checked rows up to date for the intakes that the given answers came by, and ends an intake whose
 * rows are all checked.
 */
export async function countIntakeChecks(
  { transaction, now }: ServiceContext,
  answerIds: readonly string[],
): Promise<void> {
  if (answerIds.length === 0) return;
  // The rows are locked before they are counted: of two jobs that end together the second sees what the first wrote.
  const touched = await database().query<{ id: string }>(
    `select i.id from intakes i
      where i.id in (select r.intake_id from intake_rows r where r.answer_id in (:answerIds))
      order by i.id for update`,
    { type: QueryTypes.SELECT, transaction, replacements: { answerIds: [...answerIds] } },
  );
  if (touched.length === 0) return;
  await database().query(
    `with counted as (
       select r.intake_id as id, count(*) filter (where a.check_state <> 'waiting')::int as checked
         from intake_rows r
         join answers a on a.id = r.answer_id
        where r.intake_id in (:intakeIds)
        group by r.intake_id)
     update intakes i
        set rows_checked = least(c.checked, i.rows_committed),
            state = case when i.state = 'checking' and c.checked >= i.rows_accepted then 'done' else i.state end,
            finished_at = case
              when i.state = 'checking' and c.checked >= i.rows_accepted then :now::timestamptz else i.finished_at end,
            updated_at = :now::timestamptz
       from counted c
      where i.id = c.id`,
    {
      type: QueryTypes.UPDATE,
      transaction,
      replacements: { intakeIds: touched.map(({ id }) => id), now: now.toISOString() },
    },
  );
}
