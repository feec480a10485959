import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type Thousandths } from '@/lib/domain/credit';

/** An answer marked twice. Credits are of the first ruling and of the blind second marking, never of a settlement. */
export type PairOfMarkings = {
  secondMarkingId: string;
  state: 'marked' | 'to-settle' | 'settled';
  question: number;
  partKey: string;
  firstGraderId: string;
  firstGraderName: string;
  secondGraderId: string;
  secondGraderName: string;
  firstCredit: Thousandths;
  secondCredit: Thousandths;
  outOf: Thousandths;
};

/** The answers of a set that were marked twice, and how many second markings are still to be done. */
export type SecondMarkingsOfSet = { pairs: PairOfMarkings[]; outstanding: number };

type Bound = {
  setId: string;
  /** Only pairs in which this grader gave one of the two; null for all. */
  graderId: string | null;
};

/** Reads the pairs of a set's first and second markings in a stable order; a first ruling taken back is no marking. */
export async function secondMarkingsOfSet(
  { setId, graderId }: Bound,
  transaction?: Transaction,
): Promise<SecondMarkingsOfSet> {
  const options = { type: QueryTypes.SELECT, replacements: { setId, graderId }, transaction } as const;
  const pairs = await database().query<PairOfMarkings>(
    `select m.id as "secondMarkingId", m.state, i.position as question, q.part_key as "partKey",
            m.first_grader_id as "firstGraderId", one.name as "firstGraderName",
            m.grader_id as "secondGraderId", other.name as "secondGraderName",
            r.credit as "firstCredit", m.credit as "secondCredit", r.out_of as "outOf"
       from second_markings m
       join rulings r on r.id = m.ruling_id
       join queue_items q on q.id = r.queue_item_id
       join problem_set_items i on i.id = q.item_id
       join users one on one.id = m.first_grader_id
       join users other on other.id = m.grader_id
      where m.problem_set_id = :setId
        and m.state in ('marked', 'to-settle', 'settled')
        and r.out_of > 0
        and not exists (select 1 from ruling_reversals v where v.ruling_id = r.id)
        and (cast(:graderId as uuid) is null or cast(:graderId as uuid) in (m.first_grader_id, m.grader_id))
      order by i.position, q.part_key, m.id`,
    options,
  );
  const [count] = await database().query<{ outstanding: number }>(
    `select count(*)::integer as outstanding
       from second_markings m
      where m.problem_set_id = :setId
        and m.state in ('assigned', 'taken')
        and (cast(:graderId as uuid) is null or m.grader_id = cast(:graderId as uuid))`,
    options,
  );
  return { pairs, outstanding: count?.outstanding ?? 0 };
}
