import { Template } from '@/models/template';
import { HalfmarkError } from '@/lib/errors';
import { canReadTemplate } from '@/lib/policies/can-read-template';
import { canWriteTemplate } from '@/lib/policies/can-write-template';
import { requireAllowed } from '@/lib/policies/decide';
import { templateForPolicy } from '@/lib/queries/template-for-policy';
import { type ServiceContext } from './context';

/**
 * A template that the actor may change, held for the rest of the transaction. For somebody who may not even read it and
 * for an id of nothing it is `not-found`; a reader who may not write is `forbidden`. A `revision` that is not the
 * present one is a `conflict`, and nothing is overwritten.
 */
export async function loadTemplateForEdit(
  { actor, transaction }: ServiceContext,
  input: { templateId: string; revision?: number },
): Promise<Template> {
  const template = await Template.findByPk(input.templateId, { transaction, lock: transaction.LOCK.UPDATE });
  if (template === null) throw new HalfmarkError('not-found');
  const place = await templateForPolicy(template.id, transaction);
  if (!canReadTemplate(actor, place).allowed) throw new HalfmarkError('not-found');
  requireAllowed(canWriteTemplate(actor, place));
  if (input.revision !== undefined && input.revision !== template.draftRevision) {
    throw new HalfmarkError(
      'conflict',
      'Somebody else, or you in another window, changed this question meanwhile. What you wrote is still on this page.',
    );
  }
  return template;
}
