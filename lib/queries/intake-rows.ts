import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';
import type { Verdict } from '@/lib/domain/verdict';

/** A row of an upload: how it was matched, and what came of it. */
export type IntakeRowLine = {
  line: number;
  student: string;
  question: string;
  part: string;
  answer: string;
  state: 'accepted' | 'refused';
  message: string | null;
  attempt: number | null;
  verdict: Verdict | null;
  checkState: 'waiting' | 'checked' | 'failed' | null;
  /** Whether a person has yet to look at it. */
  queued: boolean;
};

const columns = `
  r.line, coalesce(u.email, r.fields ->> 'student', '') as student, coalesce(r.fields ->> 'question', '') as question,
  coalesce(r.fields ->> 'part', '') as part, coalesce(r.text, r.fields ->> 'answer', '') as answer, r.state, r.message,
  a.attempt, a.check_state as "checkState", c.verdict,
  exists (select from queue_items q where q.answer_id = a.id and q.state in ('waiting', 'taken', 'escalated')) as queued`;

const tables = `
  from intake_rows r
  left join users u on u.id = r.user_id
  left join answers a on a.id = r.answer_id
  left join answer_checks c on c.id = a.current_check_id`;

export type IntakeRowFilter = 'all' | 'refused' | 'noted';

const filters: Record<IntakeRowFilter, string> = {
  all: 'true',
  refused: `r.state = 'refused'`,
  noted: `r.state = 'accepted' and r.message is not null`,
};

/** One page of the rows of an upload, in the order of the sheet. */
export async function intakeRows(
  intakeId: string,
  { filter, from, most }: { filter: IntakeRowFilter; from: number; most: number },
): Promise<IntakeRowLine[]> {
  return database().query<IntakeRowLine>(
    `select ${columns} ${tables} where r.intake_id = :intakeId and ${filters[filter]}
      order by r.line, r.cell limit :most offset :from`,
    { type: QueryTypes.SELECT, replacements: { intakeId, from, most } },
  );
}

const AT_ONCE = 1000;

/** Every row of an upload, read a thousand at a time. */
export async function* allIntakeRows(intakeId: string): AsyncGenerator<IntakeRowLine> {
  let after = { line: -1, cell: -1 };
  for (;;) {
    const rows = await database().query<IntakeRowLine & { cell: number }>(
      `select ${columns}, r.cell ${tables}
        where r.intake_id = :intakeId and (r.line, r.cell) > (:line, :cell)
        order by r.line, r.cell limit :most`,
      { type: QueryTypes.SELECT, replacements: { intakeId, ...after, most: AT_ONCE } },
    );
    yield* rows;
    const last = rows.at(-1);
    if (rows.length < AT_ONCE || !last) return;
    after = { line: last.line, cell: last.cell };
  }
}

/** How the answers of an upload came out. */
export type IntakeOutcome = Record<Verdict, number> & { queued: number; noted: number };

/** Counts verdicts, what is queued for a person, and rows that carry a note. */
export async function intakeOutcome(intakeId: string): Promise<IntakeOutcome> {
  const [row] = await database().query<IntakeOutcome>(
    `select count(*) filter (where c.verdict = 'agrees')::int as agrees,
            count(*) filter (where c.verdict = 'differs')::int as differs,
            count(*) filter (where c.verdict = 'undecided')::int as undecided,
            count(*) filter (where c.verdict = 'unreadable')::int as unreadable,
            count(*) filter (where r.state = 'accepted' and r.message is not null)::int as noted,
            count(*) filter (where exists (
              select from queue_items q
               where q.answer_id = a.id and q.state in ('waiting', 'taken', 'escalated')))::int as queued
       ${tables}
      where r.intake_id = :intakeId`,
    { type: QueryTypes.SELECT, replacements: { intakeId } },
  );
  return row ?? { agrees: 0, differs: 0, undecided: 0, unreadable: 0, queued: 0, noted: 0 };
}
