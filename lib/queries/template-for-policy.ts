import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { HalfmarkError } from '@/lib/errors';
import { type TemplateForPolicy } from '@/lib/policies/can-read-template';

/**
 * Where a template stands, as policies ask: the courses of its department, and those whose sets use any of its versions.
 *
 * @throws HalfmarkError `not-found`
 */
export async function templateForPolicy(templateId: string, transaction?: Transaction): Promise<TemplateForPolicy> {
  const places = await templatesForPolicy([templateId], transaction);
  const place = places.get(templateId);
  if (place === undefined) throw new HalfmarkError('not-found');
  return place;
}

type Row = { id: string; department_course_ids: string[]; used_in_course_ids: string[] };

/** The same for several templates at once, by their id; those that do not exist are left out. */
export async function templatesForPolicy(
  templateIds: readonly string[],
  transaction?: Transaction,
): Promise<Map<string, TemplateForPolicy>> {
  if (templateIds.length === 0) return new Map();
  const rows = await database().query<Row>(
    `select t.id,
            array(select c.id from courses c where c.department_id = t.department_id) as department_course_ids,
            array(select distinct s.course_id
                    from template_versions v
                    join problem_set_items i on i.template_version_id = v.id
                    join problem_sets s on s.id = i.problem_set_id
                   where v.template_id = t.id) as used_in_course_ids
       from templates t
      where t.id in (:templateIds)`,
    { type: QueryTypes.SELECT, replacements: { templateIds }, transaction },
  );
  return new Map(
    rows.map((row) => [
      row.id,
      { departmentCourseIds: row.department_course_ids, usedInCourseIds: row.used_in_course_ids },
    ]),
  );
}
