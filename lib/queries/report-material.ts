import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { Verdict } from '@/lib/domain/verdict';
import type { AppealOutcome } from '@/models/appeal';
import type { DrawnValues, TemplateContent } from '@/lib/templates/content';

/** A question of a set as one student has it; `values` is null where the student never opened it. */
export type ReportItemRow = {
  itemId: string;
  position: number;
  points: number;
  drawId: string | null;
  values: DrawnValues | null;
  content: TemplateContent;
};

/** The standing attempt at one part, with its verdict, credit and the ruling behind it, as far as there is one. */
export type ReportAnswerRow = {
  answerId: string;
  drawId: string;
  partKey: string;
  text: string;
  verdict: Verdict | null;
  slip: string | null;
  readingLatex: string | null;
  readingPlain: string | null;
  credit: number | null;
  creditSource: string | null;
  comment: string | null;
  /** What came of the appeal of this answer, once it is answered. */
  appealOutcome: AppealOutcome | null;
  /** The appeal was answered by who marked the part before, for want of another grader. */
  sameGrader: boolean;
  /** Whether the checker or a person has yet to decide. */
  waits: boolean;
};

/** The questions of a set with one student's draws, in order. */
export async function reportItems(
  problemSetId: string,
  userId: string,
  transaction?: Transaction,
): Promise<ReportItemRow[]> {
  return database().query<ReportItemRow>(
    `select i.id as "itemId", i.position, i.points, d.id as "drawId", d.drawn_values as "values", v.content
       from problem_set_items i
       left join draws d on d.item_id = i.id and d.user_id = :userId
       join template_versions v on v.id = coalesce(d.template_version_id, i.template_version_id)
      where i.problem_set_id = :problemSetId
      order by i.position`,
    { type: QueryTypes.SELECT, transaction, replacements: { problemSetId, userId } },
  );
}

/** One student's standing answers in a set. */
export async function reportAnswers(
  problemSetId: string,
  userId: string,
  transaction?: Transaction,
): Promise<ReportAnswerRow[]> {
  return database().query<ReportAnswerRow>(
    `select a.id as "answerId", a.draw_id as "drawId", a.part_key as "partKey", a.text,
            c.verdict, c.slip, c.reading_latex as "readingLatex", c.reading_plain as "readingPlain",
            e.credit, e.source as "creditSource", r.comment,
            p.outcome as "appealOutcome", coalesce(p.same_grader_noted, false) as "sameGrader",
            (a.check_state <> 'checked' or e.id is null or exists (
               select from queue_items q
                where q.answer_id = a.id and q.kind = 'review'
                  and q.state in ('waiting', 'taken', 'escalated', 'to-settle'))) as waits
       from answers a
       join draws d on d.id = a.draw_id
       join problem_set_items i on i.id = d.item_id
       left join answer_checks c on c.id = a.current_check_id
       left join credit_entries e on e.id = a.current_credit_entry_id
       left join rulings r on r.id = e.ruling_id
       left join lateral (
         select outcome, same_grader_noted from appeals
          where answer_id = a.id and state = 'answered'
          order by answered_at desc limit 1) p on true
      where i.problem_set_id = :problemSetId and d.user_id = :userId and a.superseded_at is null`,
    { type: QueryTypes.SELECT, transaction, replacements: { problemSetId, userId } },
  );
}
