import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { Evidence } from '@/lib/checker/contract';
import type { Verdict } from '@/lib/domain/verdict';
import type { CreditSource } from '@/models/credit-entry';
import { HalfmarkError } from '@/lib/errors';
import type { DrawnValues, TemplateContent } from '@/lib/templates/content';

/** One answer with the question it belongs to and what the checker found, as those who mark it are shown it. */
export type AnswerForMarking = {
  answerId: string;
  problemSetId: string;
  drawId: string;
  itemId: string;
  studentId: string;
  studentName: string;
  position: number;
  points: number;
  partKey: string;
  text: string;
  attempt: number;
  submittedAt: Date;
  byStaff: boolean;
  values: DrawnValues;
  content: TemplateContent;
  check: {
    verdict: Verdict;
    slips: string[];
    readingLatex: string;
    readingPlain: string;
    referenceLatex: string;
    message: string;
    evidence: Evidence;
  } | null;
};

type Row = Omit<AnswerForMarking, 'check'> & { verdict: Verdict | null } & NonNullable<AnswerForMarking['check']>;

/** Reads one answer for its markers. Whether somebody may mark it is decided before. */
export async function answerForMarking(answerId: string, transaction?: Transaction): Promise<AnswerForMarking> {
  const [row] = await database().query<Row>(
    `select a.id as "answerId", i.problem_set_id as "problemSetId", d.id as "drawId", i.id as "itemId",
            d.user_id as "studentId", u.name as "studentName", i.position, i.points, a.part_key as "partKey", a.text,
            a.attempt, s.created_at as "submittedAt", s.source <> 'typed' as "byStaff",
            d.drawn_values as "values", v.content,
            c.verdict, c.slips, c.reading_latex as "readingLatex", c.reading_plain as "readingPlain",
            c.reference_latex as "referenceLatex", c.message, c.evidence
       from answers a
       join submissions s on s.id = a.submission_id
       join draws d on d.id = a.draw_id
       join users u on u.id = d.user_id
       join problem_set_items i on i.id = d.item_id
       join template_versions v on v.id = d.template_version_id
       left join answer_checks c on c.id = a.current_check_id
      where a.id = :answerId`,
    { type: QueryTypes.SELECT, transaction, replacements: { answerId } },
  );
  if (row === undefined) throw new HalfmarkError('not-found');
  const { verdict, slips, readingLatex, readingPlain, referenceLatex, message, evidence, ...rest } = row;
  const check =
    verdict === null ? null : { verdict, slips, readingLatex, readingPlain, referenceLatex, message, evidence };
  return { ...rest, check };
}

/** One step in the history of an answer's credit. */
export type CreditStep = {
  credit: number;
  outOf: number;
  source: CreditSource;
  by: string | null;
  reason: string;
  at: Date;
};

/** The history of an answer's credit, oldest first. */
export async function creditHistory(answerId: string): Promise<CreditStep[]> {
  return database().query<CreditStep>(
    `select e.credit, e.out_of as "outOf", e.source, u.name as by, e.reason, e.created_at as at
       from credit_entries e
       left join users u on u.id = e.actor_id
      where e.answer_id = :answerId
      order by e.created_at, e.id`,
    { type: QueryTypes.SELECT, replacements: { answerId } },
  );
}

/** The other parts of the same question by the same student: where each stands. */
export type SiblingPart = {
  partKey: string;
  verdict: Verdict | null;
  credit: number | null;
  outOf: number | null;
  waits: boolean;
};

/** The standing answers to the other parts of a draw, by part. */
export async function siblingParts(drawId: string, exceptPart: string): Promise<SiblingPart[]> {
  return database().query<SiblingPart>(
    `select a.part_key as "partKey", c.verdict, e.credit, e.out_of as "outOf",
            exists (select from queue_items q
                     where q.answer_id = a.id and q.state in ('waiting', 'taken', 'escalated', 'to-settle')) as waits
       from answers a
       left join answer_checks c on c.id = a.current_check_id
       left join credit_entries e on e.id = a.current_credit_entry_id
      where a.draw_id = :drawId and a.superseded_at is null and a.part_key <> :exceptPart
      order by a.part_key`,
    { type: QueryTypes.SELECT, replacements: { drawId, exceptPart } },
  );
}

/** Earlier attempts at the same part, oldest first. */
export async function earlierAttempts(
  drawId: string,
  partKey: string,
  before: number,
): Promise<{ attempt: number; text: string; verdict: Verdict | null }[]> {
  return database().query(
    `select a.attempt, a.text, c.verdict
       from answers a
       left join answer_checks c on c.id = a.current_check_id
      where a.draw_id = :drawId and a.part_key = :partKey and a.attempt < :before
      order by a.attempt`,
    { type: QueryTypes.SELECT, replacements: { drawId, partKey, before } },
  );
}
