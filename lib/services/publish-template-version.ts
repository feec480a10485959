import { createHash } from 'node:crypto';
import { z } from 'zod';
import { TemplateVersion } from '@/models/template-version';
import { HalfmarkError } from '@/lib/errors';
import { requirePerson } from '@/lib/policies/decide';
import { readDraft } from '@/lib/templates/draft';
import { findProblems } from '@/lib/templates/find-problems';
import { type ServiceContext } from './context';
import { loadTemplateForEdit } from './load-template-for-edit';
import { recordAuditEvent } from './record-audit-event';

export const publishTemplateVersionInput = z.object({ templateId: z.uuid(), revision: z.int().positive() });

/**
 * Publishes the draft as the next version, which never changes afterwards. Every reference is worked out on sample draws
 * first; a draft with a mistake is refused as `invalid`, each mistake at its place. A draft that says the same as the
 * last version is refused, too.
 */
export async function publishTemplateVersion(
  context: ServiceContext,
  input: z.output<typeof publishTemplateVersionInput>,
): Promise<{ versionId: string; number: number }> {
  const { transaction, now, actor } = context;
  const template = await loadTemplateForEdit(context, input);
  const { problems, content } = findProblems(readDraft(template.draft));
  if (content === null) {
    const mistakes = problems.filter((problem) => problem.weight === 'mistake');
    throw new HalfmarkError('invalid', 'This question cannot be published yet: mend what is marked.', {
      fields: Object.fromEntries(mistakes.map(({ path, message }) => [path, message])),
    });
  }
  const contentHash = createHash('sha256').update(JSON.stringify(content)).digest('hex');
  const last = await TemplateVersion.findOne({
    where: { templateId: template.id },
    order: [['number', 'desc']],
    transaction,
  });
  if (last?.contentHash === contentHash) {
    throw new HalfmarkError(
      'wrong-state',
      `Nothing changed since version ${last.number}, so there is nothing to publish.`,
    );
  }
  const version = await TemplateVersion.create(
    {
      templateId: template.id,
      number: (last?.number ?? 0) + 1,
      content,
      contentHash,
      publishedBy: requirePerson(actor).userId,
      publishedAt: now,
      sweep: null,
    },
    { transaction },
  );
  await recordAuditEvent(context, {
    action: 'publish-template',
    subject: { kind: 'template', id: template.id },
    details: { versionId: version.id, number: version.number, contentHash },
  });
  return { versionId: version.id, number: version.number };
}
