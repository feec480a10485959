import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type Verdict } from '@/lib/domain/verdict';

/** One attempt at a part, with what the checker found and the hand-in it came by. */
export type AttemptRow = {
  answerId: string;
  drawId: string;
  partKey: string;
  attempt: number;
  text: string;
  /** Whether this is the attempt that stands. */
  stands: boolean;
  /** Null while it waits for its verdict. */
  verdict: Verdict | null;
  receipt: string;
  submittedAt: Date;
  source: 'typed' | 'intake';
};

/** Every attempt at the parts of the given draws, by draw, part and number. */
export async function attemptsOfDraws(drawIds: readonly string[], transaction?: Transaction): Promise<AttemptRow[]> {
  if (drawIds.length === 0) return [];
  return database().query<AttemptRow>(
    `select a.id as "answerId", a.draw_id as "drawId", a.part_key as "partKey", a.attempt, a.text,
            a.superseded_at is null as stands, c.verdict, s.receipt, s.submitted_at as "submittedAt", s.source
       from answers a
       join submissions s on s.id = a.submission_id
       left join answer_checks c on c.id = a.current_check_id
      where a.draw_id in (:drawIds)
      order by a.draw_id, a.part_key, a.attempt`,
    { type: QueryTypes.SELECT, replacements: { drawIds }, transaction },
  );
}
