import { QueryTypes, type Transaction } from 'sequelize';
import { database } from '@/lib/db/connection';
import { type PersonActor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { canReadTemplate } from '@/lib/policies/can-read-template';
import { canWriteTemplate } from '@/lib/policies/can-write-template';
import { readDraft, type TemplateDraft } from '@/lib/templates/draft';
import { templateForPolicy } from './template-for-policy';

/** A published version in the list of its template. */
export type VersionView = {
  id: string;
  number: number;
  publishedAt: Date;
  publishedBy: string;
  /** The sets that use it, as "PHY 342, set 4". */
  usedIn: string[];
};

export type TemplateForEditor = {
  id: string;
  name: string;
  department: string;
  topics: string[];
  draft: TemplateDraft;
  revision: number;
  changedAt: Date;
  mayWrite: boolean;
  /** The latest first. */
  versions: VersionView[];
};

type TemplateRow = Omit<TemplateForEditor, 'draft' | 'mayWrite' | 'versions'> & { draft: unknown };

/**
 * A template with its draft and versions, for somebody who may read it.
 *
 * @throws HalfmarkError `not-found`; `forbidden` with the reason for who is a student where it is used
 */
export async function templateForEditor(
  actor: PersonActor,
  templateId: string,
  transaction?: Transaction,
): Promise<TemplateForEditor> {
  const place = await templateForPolicy(templateId, transaction);
  const readable = canReadTemplate(actor, place);
  const isNear = [...place.departmentCourseIds, ...place.usedInCourseIds].some((id) => actor.memberships.has(id));
  if (!readable.allowed) throw new HalfmarkError(isNear ? 'forbidden' : 'not-found', isNear ? readable.why : undefined);
  const options = { type: QueryTypes.SELECT, replacements: { templateId }, transaction } as const;
  const [template] = await database().query<TemplateRow>(
    `select t.id, t.name, d.name as department, t.topics, t.draft, t.draft_revision as revision,
            t.updated_at as "changedAt"
       from templates t join departments d on d.id = t.department_id
      where t.id = :templateId`,
    options,
  );
  if (template === undefined) throw new HalfmarkError('not-found');
  const versions = await database().query<VersionView>(
    `select v.id, v.number, v.published_at as "publishedAt", u.name as "publishedBy",
            array(select c.code || ', set ' || s.number
                    from problem_set_items i
                    join problem_sets s on s.id = i.problem_set_id
                    join courses c on c.id = s.course_id
                   where i.template_version_id = v.id
                   order by c.code, s.number) as "usedIn"
       from template_versions v join users u on u.id = v.published_by
      where v.template_id = :templateId
      order by v.number desc`,
    options,
  );
  return {
    ...template,
    draft: readDraft(template.draft),
    mayWrite: canWriteTemplate(actor, place).allowed,
    versions,
  };
}
