'use server';

import { revalidatePath } from 'next/cache';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { publishTemplateVersion, publishTemplateVersionInput } from '@/lib/services/publish-template-version';
import { saveTemplateDraft, saveTemplateDraftInput } from '@/lib/services/save-template-draft';
import { type TemplateDraft } from '@/lib/templates/draft';
import { renderPreview, type RenderedPreview } from './_components/render-preview';

export type SavedDraft = { revision: number; preview: RenderedPreview };

/** Keeps a draft and answers with what it would look like, and what is wrong with it. */
export async function saveDraft(input: {
  templateId: string;
  revision: number;
  draft: TemplateDraft;
  topics: string[];
}): Promise<ActionResult<SavedDraft>> {
  const result = await runAction(saveTemplateDraftInput, input, async (context, parsed) => ({
    ...(await saveTemplateDraft(context, parsed)),
    draft: parsed.draft,
  }));
  if (!result.ok) return result;
  // Outside the transaction: working references out takes longer than writing a row.
  return { ok: true, value: { revision: result.value.revision, preview: renderPreview(result.value.draft) } };
}

/** Publishes the draft as the next version. */
export async function publishDraft(input: {
  templateId: string;
  revision: number;
}): Promise<ActionResult<{ number: number }>> {
  const result = await runAction(publishTemplateVersionInput, input, publishTemplateVersion);
  if (result.ok) revalidatePath(paths.template(input.templateId));
  return result;
}
