import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { dividePoints, type Thousandths } from '@/lib/domain/credit';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';
import { setPolicySchema, type SetPolicy } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { type AnswerKind, type TemplateContent } from '@/lib/templates/content';

/** A question of a set as its staff see it; nothing of its references. */
export type ItemForStaff = {
  id: string;
  position: number;
  points: Thousandths;
  templateId: string;
  templateVersionId: string;
  title: string;
  version: number;
  /** The latest version of the template, where that is a later one. */
  newerVersion: number | null;
  parts: { key: string; kind: AnswerKind; outOf: Thousandths }[];
  /** Students who have a draw. */
  draws: number;
};

export type SetForStaff = {
  id: string;
  courseId: string;
  number: number;
  title: string;
  state: ProblemSetState;
  opensAt: Date | null;
  closesAt: Date | null;
  appealsUntil: Date | null;
  attemptsAllowed: number;
  policy: SetPolicy;
  revision: number;
  items: ItemForStaff[];
  points: Thousandths;
  answeredBy: number;
  waiting: number;
};

type SetRow = Omit<SetForStaff, 'items' | 'points' | 'policy'> & { policy: unknown };
type ItemRow = Omit<ItemForStaff, 'title' | 'parts' | 'newerVersion'> & { content: TemplateContent; latest: number };

/**
 * A set of a course with its questions and counts.
 *
 * @throws HalfmarkError `not-found`, also for a set of another course
 */
export async function setForStaff(courseId: string, setId: string, transaction?: Transaction): Promise<SetForStaff> {
  const options = { type: QueryTypes.SELECT, replacements: { courseId, setId }, transaction } as const;
  const [set] = await database().query<SetRow>(
    `select p.id, p.course_id as "courseId", p.number, p.title, p.state, p.opens_at as "opensAt",
            p.closes_at as "closesAt", p.appeals_until as "appealsUntil", p.attempts_allowed as "attemptsAllowed",
            p.policy, p.revision,
            (select count(distinct s.user_id)
               from problem_set_items i
               join draws d on d.item_id = i.id
               join submissions s on s.draw_id = d.id
              where i.problem_set_id = p.id)::integer as "answeredBy",
            (select count(*) from queue_items q
              where q.problem_set_id = p.id and q.state in ('waiting', 'taken', 'escalated'))::integer as waiting
       from problem_sets p
      where p.id = :setId and p.course_id = :courseId`,
    options,
  );
  if (set === undefined) throw new HalfmarkError('not-found');
  const rows = await database().query<ItemRow>(
    `select i.id, i.position, i.points, v.template_id as "templateId", v.id as "templateVersionId",
            v.number as version, v.content,
            (select max(w.number) from template_versions w where w.template_id = v.template_id) as latest,
            (select count(*) from draws d where d.item_id = i.id)::integer as draws
       from problem_set_items i
       join template_versions v on v.id = i.template_version_id
      where i.problem_set_id = :setId
      order by i.position`,
    options,
  );
  return {
    ...set,
    policy: setPolicySchema.parse(set.policy),
    items: rows.map(presentItem),
    points: rows.reduce((sum, row) => sum + row.points, 0),
  };
}

function presentItem({ content, latest, ...row }: ItemRow): ItemForStaff {
  const outOf = dividePoints(
    row.points,
    content.parts.map((part) => part.weight),
  );
  return {
    ...row,
    title: content.title,
    newerVersion: latest > row.version ? latest : null,
    parts: content.parts.map((part, index) => ({ key: part.key, kind: part.kind, outOf: outOf[index] ?? 0 })),
  };
}
