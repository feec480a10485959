import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type PersonActor } from '@/lib/domain/actor';
import { canReadTemplate } from '@/lib/policies/can-read-template';
import { type AnswerKind } from '@/lib/templates/content';
import { departmentsOf } from './departments-of';
import { templatesForPolicy } from './template-for-policy';

/** A template in the list of the shelf. */
export type ShelfTemplate = {
  id: string;
  name: string;
  department: string;
  topics: string[];
  /** The latest published version; null while there is none. */
  version: number | null;
  versionId: string | null;
  publishedAt: Date | null;
  changedAt: Date;
  /** Kinds of the latest version's parts, in order; empty while there is none. */
  kinds: AnswerKind[];
  /** Sets that use any of its versions. */
  sets: number;
};

/**
 * The templates of the departments that a person works for, and those their courses use, by name; without those that
 * the person may not read because they are a student where a template is used.
 */
export async function shelfFor(actor: PersonActor, transaction?: Transaction): Promise<ShelfTemplate[]> {
  const departments = await departmentsOf(actor, transaction);
  if (departments.length === 0) return [];
  const templates = await database().query<ShelfTemplate>(
    `select t.id, t.name, d.name as department, t.topics, v.number as version, v.id as "versionId",
            v.published_at as "publishedAt", t.updated_at as "changedAt",
            coalesce((select json_agg(part ->> 'kind' order by at)
                        from jsonb_array_elements(v.content -> 'parts') with ordinality as parts (part, at)), '[]') as kinds,
            (select count(distinct i.problem_set_id)
               from template_versions w join problem_set_items i on i.template_version_id = w.id
              where w.template_id = t.id)::integer as sets
       from templates t
       join departments d on d.id = t.department_id
       left join lateral (
         select * from template_versions v where v.template_id = t.id order by v.number desc limit 1) v on true
      where t.archived_at is null and t.department_id in (:departmentIds)
      order by lower(t.name), t.id`,
    {
      type: QueryTypes.SELECT,
      replacements: { departmentIds: departments.map((department) => department.id) },
      transaction,
    },
  );
  const places = await templatesForPolicy(
    templates.map((template) => template.id),
    transaction,
  );
  return templates.filter((template) => {
    const place = places.get(template.id);
    return place !== undefined && canReadTemplate(actor, place).allowed;
  });
}
