import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type DeliveryState } from '@/models/delivery';

/** Score reports by the state of their mail. */
export type DeliveryCounts = Record<DeliveryState, number>;

/** A mail that a person must look at: refused for good, or cut short and perhaps delivered. */
export type TroubledDelivery = {
  id: string;
  courseId: string;
  courseCode: string;
  setId: string;
  setNumber: number;
  state: 'failed' | 'unconfirmed';
  lastError: string | null;
  at: Date;
};

/** How many score reports are in each state, and the latest hundred that need a look. */
export async function mailState(): Promise<{ counts: DeliveryCounts; troubled: TroubledDelivery[] }> {
  const [grouped, troubled] = await Promise.all([
    database().query<{ state: DeliveryState; count: number }>(
      'select state, count(*)::integer as count from deliveries group by state',
      { type: QueryTypes.SELECT },
    ),
    database().query<TroubledDelivery>(
      `select d.id, c.id as "courseId", c.code as "courseCode", p.id as "setId", p.number as "setNumber", d.state,
              d.last_error as "lastError", coalesce(d.sending_at, d.created_at) as at
         from deliveries d
         join score_reports r on r.id = d.score_report_id
         join problem_sets p on p.id = r.problem_set_id
         join courses c on c.id = p.course_id
        where d.state in ('failed', 'unconfirmed')
        order by at desc limit 100`,
      { type: QueryTypes.SELECT },
    ),
  ]);
  const counts: DeliveryCounts = { waiting: 0, sending: 0, sent: 0, unconfirmed: 0, failed: 0 };
  for (const { state, count } of grouped) counts[state] = count;
  return { counts, troubled };
}
