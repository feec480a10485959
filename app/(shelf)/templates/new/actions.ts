'use server';

import { redirect } from 'next/navigation';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { createTemplate, createTemplateInput } from '@/lib/services/create-template';

/** Puts an empty question on a shelf and goes to its editor. */
export async function makeTemplate(form: FormData): Promise<ActionResult<unknown>> {
  const schema = createTemplateInput.pick({ departmentId: true, name: true });
  const result = await runAction(schema, form, createTemplate);
  if (result.ok) redirect(paths.template(result.value.templateId));
  return result;
}
