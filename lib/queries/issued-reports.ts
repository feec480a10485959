import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { ScoreReportContent } from '@/lib/presenters/score-report';
import type { AppealOutcome } from '@/models/appeal';
import type { DeliveryState } from '@/models/delivery';

/** A report as it was issued; what it says never changes afterwards. */
export type IssuedReport = {
  revision: number;
  /** Why it was issued, in words for the student. */
  reason: string;
  content: ScoreReportContent;
  createdAt: Date;
  delivery: DeliveryState;
};

/** An appeal as its student sees it. */
export type OwnAppeal = {
  answerId: string;
  reason: string;
  createdAt: Date;
  outcome: AppealOutcome | null;
  answeredAt: Date | null;
  /** Answered by who marked the part before, for want of another grader. */
  sameGrader: boolean;
};

/** Values at which an answer and its reference differ, as short decimal texts, and where in the answer. */
export type ReportedWitness = {
  answerId: string;
  values: Record<string, string>;
  element: string;
  reference: string;
  answer: string;
};

/** Whose report, and on which set. */
export type WhoseReport = { problemSetId: string; userId: string };

/** The reports a student was sent for a set, the latest first; empty before release. */
export async function issuedReports(whose: WhoseReport, transaction?: Transaction): Promise<IssuedReport[]> {
  return database().query<IssuedReport>(
    `select r.revision, r.reason, r.content, r.created_at as "createdAt", d.state as delivery
       from score_reports r
       join deliveries d on d.score_report_id = r.id
      where r.problem_set_id = :problemSetId and r.user_id = :userId
      order by r.revision desc`,
    { type: QueryTypes.SELECT, transaction, replacements: whose },
  );
}

/** A student's appeals in a set. */
export async function appealsOf(whose: WhoseReport, transaction?: Transaction): Promise<OwnAppeal[]> {
  return database().query<OwnAppeal>(
    `select answer_id as "answerId", reason, created_at as "createdAt", outcome, answered_at as "answeredAt",
            same_grader_noted as "sameGrader"
       from appeals
      where problem_set_id = :problemSetId and user_id = :userId
      order by created_at`,
    { type: QueryTypes.SELECT, transaction, replacements: whose },
  );
}

/**
 * The witnesses of a student's standing answers that were found to differ. They hold values of the reference: callers
 * ask for them after release only.
 */
export async function witnessesOf(whose: WhoseReport, transaction?: Transaction): Promise<ReportedWitness[]> {
  return database().query<ReportedWitness>(
    `select a.id as "answerId", c.evidence -> 'witness' -> 'values' as values,
            c.evidence -> 'witness' ->> 'element' as element,
            c.evidence -> 'witness' ->> 'reference' as reference,
            c.evidence -> 'witness' ->> 'answer' as answer
       from answers a
       join draws d on d.id = a.draw_id
       join problem_set_items i on i.id = d.item_id
       join answer_checks c on c.id = a.current_check_id
      where i.problem_set_id = :problemSetId and d.user_id = :userId and a.superseded_at is null
        and c.verdict = 'differs' and jsonb_typeof(c.evidence -> 'witness') = 'object'`,
    { type: QueryTypes.SELECT, transaction, replacements: whose },
  );
}
