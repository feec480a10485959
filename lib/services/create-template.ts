import { z } from 'zod';
import { Template } from '@/models/template';
import { HalfmarkError } from '@/lib/errors';
import { canWriteTemplate } from '@/lib/policies/can-write-template';
import { requireAllowed, requirePerson } from '@/lib/policies/decide';
import { departmentForPolicy } from '@/lib/queries/departments-of';
import { emptyDraft } from '@/lib/templates/blank-draft';
import { templateDraftSchema } from '@/lib/templates/draft';
import { type ServiceContext } from './context';
import { recordAuditEvent } from './record-audit-event';

export const createTemplateInput = z.object({
  departmentId: z.uuid('Choose a department.'),
  name: z.string().trim().min(1, 'Give the question a title.').max(200, 'At most 200 characters.'),
  /** What the draft begins with; an empty question where it is left out. */
  draft: templateDraftSchema.optional(),
  topics: z.array(z.string().trim().min(1).max(40)).max(30).default([]),
});

/** Puts a new question with an unpublished draft on a department's shelf. Returns its id and the draft's revision. */
export async function createTemplate(
  context: ServiceContext,
  input: z.input<typeof createTemplateInput>,
): Promise<{ templateId: string; revision: number }> {
  const { actor, transaction } = context;
  const department = await departmentForPolicy(input.departmentId, transaction);
  if (department === null) throw new HalfmarkError('not-found');
  requireAllowed(canWriteTemplate(actor, { departmentCourseIds: department.courseIds, usedInCourseIds: [] }));
  const template = await Template.create(
    {
      departmentId: department.id,
      name: input.name,
      topics: input.topics ?? [],
      draft: templateDraftSchema.parse(input.draft ?? emptyDraft(input.name)),
      forkedFromVersionId: null,
      createdBy: requirePerson(actor).userId,
      archivedAt: null,
    },
    { transaction },
  );
  await recordAuditEvent(context, {
    action: 'create-template',
    subject: { kind: 'template', id: template.id },
    details: { name: input.name, departmentId: department.id },
  });
  return { templateId: template.id, revision: template.draftRevision };
}
