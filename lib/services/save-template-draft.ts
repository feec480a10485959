import { z } from 'zod';
import { templateDraftSchema } from '@/lib/templates/draft';
import { type ServiceContext } from './context';
import { loadTemplateForEdit } from './load-template-for-edit';

export const saveTemplateDraftInput = z.object({
  templateId: z.uuid(),
  /** The revision that this draft was made from. */
  revision: z.int().positive(),
  draft: templateDraftSchema,
  topics: z.array(z.string().trim().min(1).max(40)).max(30).optional(),
});

/**
 * Keeps the draft of a template, finished or not, as its next revision; the template goes by the draft's title once it
 * has one. A draft made from an older revision is refused as `conflict`: nothing is ever overwritten unseen. Saving is
 * not written to the audit log, publishing is.
 */
export async function saveTemplateDraft(
  context: ServiceContext,
  input: z.output<typeof saveTemplateDraftInput>,
): Promise<{ revision: number }> {
  const template = await loadTemplateForEdit(context, input);
  const title = input.draft.title.trim();
  await template.update(
    {
      draft: input.draft,
      draftRevision: template.draftRevision + 1,
      ...(title === '' ? {} : { name: title }),
      ...(input.topics === undefined ? {} : { topics: input.topics }),
    },
    { transaction: context.transaction },
  );
  return { revision: template.draftRevision };
}
