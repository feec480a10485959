import { QueryTypes } from 'sequelize';
import { database } from '@/lib/db/connection';

/** Which events to read: of one course or (null) of all, narrowed by what is given. Days are whole, in `timeZone`. */
export type AuditFilter = {
  courseId: string | null;
  action?: string;
  /** Part of the name of the person who did it. */
  who?: string;
  from?: string;
  until?: string;
  timeZone: string;
  page: number;
};

/** One line of the audit log; `who` and `subject` are names where the database knows them. */
export type AuditLine = {
  id: string;
  at: Date;
  who: string;
  action: string;
  courseCode: string | null;
  subjectKind: string | null;
  subject: string | null;
  details: Record<string, unknown>;
};

export const auditLinesPerPage = 50;

const conditions = `
      where (:courseId::uuid is null or e.course_id = :courseId::uuid)
        and (:action::text is null or e.action = :action)
        and (:who::text is null or strpos(lower(u.name), lower(:who)) > 0)
        and (:from::date is null or e.at >= :from::date::timestamp at time zone :timeZone)
        and (:until::date is null or e.at < (:until::date + 1)::timestamp at time zone :timeZone)`;

/** The events that fit, the latest first, one page of them, and how many there are in all. */
export async function auditEvents(filter: AuditFilter): Promise<{ lines: AuditLine[]; total: number }> {
  const rows = await database().query<AuditLine & { total: number }>(
    `select e.id::text as id, e.at, e.action, c.code as "courseCode", e.subject_kind as "subjectKind",
            coalesce(subject_user.name, subject_section.name, subject_token.name, subject_template.name,
                     'set ' || subject_set.number || ', ' || subject_set.title, e.details->>'name', e.subject_id) as subject,
            e.details, count(*) over ()::integer as total,
            coalesce(u.name, 'token ' || t.name, 'Halfmark, ' || (e.details->>'by'), 'Halfmark') as who
       from audit_events e
       left join users u on e.actor_kind = 'user' and u.id = e.actor_id
       left join api_tokens t on e.actor_kind = 'token' and t.id = e.actor_id
       left join courses c on c.id = e.course_id
       left join users subject_user on e.subject_kind = 'user' and subject_user.id::text = e.subject_id
       left join sections subject_section on e.subject_kind = 'section' and subject_section.id::text = e.subject_id
       left join api_tokens subject_token on e.subject_kind = 'api-token' and subject_token.id::text = e.subject_id
       left join templates subject_template on e.subject_kind = 'template' and subject_template.id::text = e.subject_id
       left join problem_sets subject_set on e.subject_kind = 'problem-set' and subject_set.id::text = e.subject_id
       ${conditions}
      order by e.at desc, e.id desc
      limit :limit offset :offset`,
    {
      type: QueryTypes.SELECT,
      replacements: {
        courseId: filter.courseId,
        action: filter.action ?? null,
        who: filter.who ?? null,
        from: filter.from ?? null,
        until: filter.until ?? null,
        timeZone: filter.timeZone,
        limit: auditLinesPerPage,
        offset: (filter.page - 1) * auditLinesPerPage,
      },
    },
  );
  return { lines: rows.map(({ total: _total, ...line }) => line), total: rows[0]?.total ?? 0 };
}

/** The actions that occur in a course's log, or (null) in the whole log, for a filter to offer. */
export async function auditActions(courseId: string | null): Promise<string[]> {
  const rows = await database().query<{ action: string }>(
    `select distinct action from audit_events
      where (:courseId::uuid is null or course_id = :courseId::uuid) order by action`,
    { type: QueryTypes.SELECT, replacements: { courseId } },
  );
  return rows.map((row) => row.action);
}
