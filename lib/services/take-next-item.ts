import { QueryTypes } from 'sequelize';
import { z } from 'zod';
import { ProblemSet } from '@/models/problem-set';
import { QueueItem } from '@/models/queue-item';
import { database } from '@/lib/db/connection';
import { HalfmarkError } from '@/lib/errors';
import { decide, requireAllowed, requirePerson, sectionBound } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import type { ServiceContext } from './context';
import { hold } from './take-queue-item';

export const takeNextItemInput = z.object({
  problemSetId: z.uuid(),
  /** Only this item of the set, or this part of it. */
  itemId: z.uuid().optional(),
  partKey: z.string().max(40).optional(),
});

/**
 * Hands the acting grader the next answer of a set that waits: what they hold already, else appeals first and then the
 * longest waiting, never one that another holds, outside their sections, of a student with whom they have a conflict of
 * interest, or an appeal against their own ruling where another grader may answer it. Two graders at the same instant
 * get different answers (rows that another transaction has locked are passed over).
 *
 * @returns the item taken, or null where nothing waits for this grader
 */
export async function takeNextItem(
  context: ServiceContext,
  input: z.output<typeof takeNextItemInput>,
): Promise<{ queueItemId: string; heldUntil: Date } | null> {
  const { actor, transaction, now } = context;
  const grader = requirePerson(actor);
  const set = await ProblemSet.findByPk(input.problemSetId, { transaction });
  if (!set) throw new HalfmarkError('not-found');
  const course = await courseForActor(actor, set.courseId, transaction);
  const decision = decide(actor, 'work-queue', course);
  requireAllowed(decision);
  const sections = sectionBound(actor, course, decision);
  const rows = await database().query<{ id: string }>(nextItemSql(sections !== null), {
    type: QueryTypes.SELECT,
    transaction,
    replacements: {
      setId: set.id,
      courseId: course.id,
      graderId: grader.userId,
      now: now.toISOString(),
      itemId: input.itemId ?? null,
      partKey: input.partKey ?? null,
      sections: sections && sections.length > 0 ? [...sections] : ['00000000-0000-0000-0000-000000000000'],
    },
  });
  const next = rows[0];
  if (!next) return null;
  const item = await QueueItem.findByPk(next.id, { transaction, rejectOnEmpty: true });
  return { queueItemId: item.id, ...(await hold(context, item, grader.userId)) };
}

function nextItemSql(bySection: boolean): string {
  return `
    select q.id
      from queue_items q
      join answers a on a.id = q.answer_id
      join draws d on d.id = a.draw_id
     where q.problem_set_id = :setId
       and (q.state = 'waiting' or (q.state = 'taken' and (q.held_by = :graderId or q.held_until <= :now::timestamptz)))
       and (:itemId::uuid is null or q.item_id = :itemId::uuid)
       and (:partKey::text is null or q.part_key = :partKey::text)
       and d.user_id <> :graderId
       and not exists (
         select from conflicts_of_interest k
          where k.course_id = :courseId and k.grader_id = :graderId and k.student_id = d.user_id)
       and (q.kind <> 'appeal' or not exists (
         select from rulings r where r.answer_id = q.answer_id and r.grader_id = :graderId))
       ${
         bySection
           ? `and exists (
         select from memberships s
          where s.course_id = :courseId and s.user_id = d.user_id and s.section_id = any (array[:sections]::uuid[]))`
           : ''
       }
     order by (q.state = 'taken' and q.held_by = :graderId) desc, (q.kind = 'appeal') desc, q.created_at, q.id
     limit 1
       for update of q skip locked`;
}
