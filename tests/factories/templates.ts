import { createHash } from 'node:crypto';
import { type CreationAttributes } from 'sequelize';
import { type TemplateContent } from '@/lib/templates/content';
import { Template } from '@/models/template';
import { TemplateVersion } from '@/models/template-version';
import { nextNumber } from './next-number';
import { buildDepartment, buildUser } from './people';
import { templateContent } from './template-content';

/** A template with a finished draft and no published version. */
export async function buildTemplate(overrides: Partial<CreationAttributes<Template>> = {}): Promise<Template> {
  return Template.create({
    name: `Template ${nextNumber()}`,
    topics: ['commutators'],
    draft: templateContent(),
    ...overrides,
    departmentId: overrides.departmentId ?? (await buildDepartment()).id,
    createdBy: overrides.createdBy ?? (await buildUser()).id,
  });
}

/** A published version, the next of its template; of a template of its own unless `template` says which. */
export async function buildTemplateVersion(
  options: { template?: Template; content?: TemplateContent; publishedBy?: string; departmentId?: string } = {},
): Promise<TemplateVersion> {
  const template =
    options.template ?? (await buildTemplate({ departmentId: options.departmentId, createdBy: options.publishedBy }));
  const content = options.content ?? templateContent();
  return TemplateVersion.create({
    templateId: template.id,
    number: (await TemplateVersion.count({ where: { templateId: template.id } })) + 1,
    content,
    contentHash: createHash('sha256').update(JSON.stringify(content)).digest('hex'),
    publishedBy: options.publishedBy ?? template.createdBy,
  });
}
