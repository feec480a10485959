import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type PersonActor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed } from '@/lib/policies/decide';
import type { DeliveryState } from '@/models/delivery';
import { ProblemSet } from '@/models/problem-set';
import { courseForActor } from './course-for-actor';

/** The mail of one report: to whom, which revision, and what became of it. */
export type DeliveryRow = {
  id: string;
  userId: string;
  student: string;
  email: string;
  revision: number;
  state: DeliveryState;
  attempts: number;
  lastError: string | null;
  /** When the state was reached, as far as it is known. */
  at: Date;
};

/** The deliveries of a set, those that need a person first, then by name. For who may release its scores. */
export async function deliveriesOf(actor: PersonActor, problemSetId: string): Promise<DeliveryRow[]> {
  const set = await ProblemSet.findByPk(problemSetId);
  if (!set) throw new HalfmarkError('not-found');
  requireAllowed(decide(actor, 'release-scores', await courseForActor(actor, set.courseId)));
  return database().query<DeliveryRow>(
    `select d.id, u.id as "userId", u.name as student, u.email, r.revision, d.state, d.attempts,
            d.last_error as "lastError", coalesce(d.sent_at, d.sending_at, d.created_at) as at
       from deliveries d
       join score_reports r on r.id = d.score_report_id
       join users u on u.id = r.user_id
      where r.problem_set_id = :problemSetId
      order by d.state in ('failed', 'unconfirmed') desc, u.name, u.id, r.revision`,
    { type: QueryTypes.SELECT, replacements: { problemSetId } },
  );
}
