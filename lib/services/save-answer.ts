import { z } from 'zod';
import { SavedAnswer } from '@/models/saved-answer';
import { HalfmarkError } from '@/lib/errors';
import { answerText, partKey } from './answer-text';
import { type ServiceContext } from './context';
import { loadOwnDraw, requireOpenFor } from './load-own-draw';

export const saveAnswerInput = z.object({
  drawId: z.uuid(),
  partKey,
  text: answerText,
  /** The revision that the page last knew; 0 where nothing was saved. */
  baseRevision: z.int().min(0),
});

/**
 * What became of it. `changed` means that another tab or device saved something else meanwhile: nothing was
 * overwritten, and what stands there comes back.
 */
export type SaveResult =
  | { kind: 'saved'; revision: number; savedAt: string }
  | { kind: 'changed'; text: string; revision: number; savedAt: string };

/**
 * Keeps what a student has typed for a part and not handed in. The same text saved again, as after a lost answer, is
 * the same save. Throws `not-found`, `forbidden`, `invalid`, or `wrong-state` for a set that takes no more answers.
 */
export async function saveAnswer(
  context: ServiceContext,
  input: z.output<typeof saveAnswerInput>,
): Promise<SaveResult> {
  const { transaction, now } = context;
  const own = await loadOwnDraw(context, input.drawId);
  if (!own.content.parts.some(({ key }) => key === input.partKey)) {
    throw new HalfmarkError('invalid', `This question has no part ${input.partKey}. Reload the page.`);
  }
  await requireOpenFor(context, own);
  const place = { drawId: own.draw.id, partKey: input.partKey };
  const before = await SavedAnswer.findOne({ where: place, transaction });
  if (before?.text === input.text) return { kind: 'saved', ...asSaved(before) };
  if (before && before.revision !== input.baseRevision) {
    return { kind: 'changed', text: before.text, ...asSaved(before) };
  }
  const saved = before
    ? await before.update({ text: input.text, revision: before.revision + 1, savedAt: now }, { transaction })
    : await SavedAnswer.create({ ...place, text: input.text, savedAt: now }, { transaction });
  return { kind: 'saved', ...asSaved(saved) };
}

function asSaved({ revision, savedAt }: SavedAnswer): { revision: number; savedAt: string } {
  return { revision, savedAt: savedAt.toISOString() };
}
