import { z } from 'zod';
import { SavedAnswer } from '@/models/saved-answer';
import { Submission } from '@/models/submission';
import { attemptsLeft } from '@/lib/domain/attempts';
import { HalfmarkError } from '@/lib/errors';
import { attemptsOfDraws, type AttemptRow } from '@/lib/queries/attempts-of-draws';
import { savedAnswers } from '@/lib/queries/saved-answers';
import { enqueue } from '@/lib/queue/enqueue';
import { isFatal } from '@/lib/checker/diagnostics';
import { readAnswer } from '@/lib/templates/read-answer';
import { answerText, partKey } from './answer-text';
import { type ServiceContext } from './context';
import { loadOwnDraw, requireOpenFor, type OwnDraw } from './load-own-draw';
import { recordAuditEvent } from './record-audit-event';
import { storeSubmission } from './store-submission';

export const handInAnswersInput = z.object({
  drawId: z.uuid(),
  answers: z
    .array(z.object({ partKey, text: answerText }))
    .min(1, 'There is nothing to hand in yet: type an answer first.')
    .max(26)
    .refine((answers) => new Set(answers.map((answer) => answer.partKey)).size === answers.length, {
      message: 'Each part is handed in once at a time.',
    }),
  /** Made by the page for this hand-in: sent twice it is stored once. */
  clientKey: z.uuid(),
  /** The student was shown that an answer cannot be read and hands it in all the same. */
  confirmUnreadable: z.boolean().default(false),
});

export type HandInInput = z.output<typeof handInAnswersInput>;

/** One part as it stands after a hand-in. */
export type HandedIn = {
  partKey: string;
  text: string;
  attempt: number;
  attemptsLeft: number;
  receipt: string;
  submittedAt: string;
  /** The revision under which the text is saved: what the page saves next is laid over it. */
  revision: number;
};

/**
 * `handed-in`: every part that was sent, as it stands now. `ask`: nothing was stored, because these answers cannot be
 * read; sent again with `confirmUnreadable` they go to a person.
 */
export type HandInResult =
  { kind: 'handed-in'; parts: HandedIn[] } | { kind: 'ask'; unreadable: { partKey: string; message: string }[] };

/** Typed answers are checked before bulk work: smaller runs first. */
const TYPED_FIRST = -10;

/**
 * Hands in answers to parts of the actor's own draw. All of them are stored, or none. A hand-in sent again (a double
 * click, a repeated request) and an answer that stands already are not stored a second time and cost no attempt.
 *
 * @throws HalfmarkError `not-found` for somebody else's draw; `wrong-state` for a set that takes no more answers or a part
 *   without attempts left; `invalid` where nothing was typed
 */
export async function handInAnswers(context: ServiceContext, input: HandInInput): Promise<HandInResult> {
  const { transaction } = context;
  const own = await loadOwnDraw(context, input.drawId);
  if (await wasStored(context, input)) return standing(context, own, keysOf(input));
  await requireOpenFor(context, own);

  const attempts = await attemptsOfDraws([own.draw.id], transaction);
  const fresh = freshAnswers(own, input, attempts);
  if (fresh.length === 0) return standing(context, own, keysOf(input));
  for (const { partKey } of fresh) requireAttempt(own, partKey, attempts);
  const unreadable = input.confirmUnreadable ? [] : unreadableOf(own, fresh);
  if (unreadable.length > 0) return { kind: 'ask', unreadable };

  const stored = await storeSubmission(context, {
    drawId: own.draw.id,
    answers: fresh,
    source: 'typed',
    // A student's own closing time has not passed here: a typed answer is never late.
    late: false,
    clientKey: input.clientKey,
  });
  await keepAsSaved(context, own, fresh);
  const answerIds = stored.answers.map(({ answerId }) => answerId);
  await enqueue('check-answers', { answerIds }, { transaction, priority: TYPED_FIRST });
  await recordAuditEvent(context, {
    action: 'hand-in-answers',
    courseId: own.course.id,
    subject: { kind: 'submission', id: stored.submissionId },
    details: { receipt: stored.receipt, parts: fresh.map((answer) => answer.partKey) },
  });
  return standing(context, own, keysOf(input));
}

function keysOf(input: HandInInput): string[] {
  return input.answers.map((answer) => answer.partKey);
}

/** Whether this very hand-in has been stored; a key that belongs to another draw was not made by our page. */
async function wasStored({ transaction }: ServiceContext, { clientKey, drawId }: HandInInput): Promise<boolean> {
  const before = await Submission.findOne({ where: { clientKey }, transaction });
  if (before && before.drawId !== drawId) throw new HalfmarkError('conflict');
  return before !== null;
}

/** The answers that say something and say something new. */
function freshAnswers(own: OwnDraw, { answers }: HandInInput, attempts: readonly AttemptRow[]): HandInInput['answers'] {
  const known = new Set(own.content.parts.map(({ key }) => key));
  for (const { partKey } of answers) {
    if (!known.has(partKey))
      throw new HalfmarkError('invalid', `This question has no part ${partKey}. Reload the page.`);
  }
  const typed = answers.filter(({ text }) => text.trim() !== '');
  if (typed.length === 0) {
    throw new HalfmarkError('invalid', 'There is nothing to hand in yet: type an answer first.');
  }
  return typed.filter(
    ({ partKey, text }) => !attempts.some((made) => made.stands && made.partKey === partKey && made.text === text),
  );
}

function requireAttempt(own: OwnDraw, key: string, attempts: readonly AttemptRow[]): void {
  if (leftFor(own, key, attempts) > 0) return;
  throw new HalfmarkError('wrong-state', `No attempt is left for part ${key}. The answer handed in last stands.`);
}

function leftFor({ set, content }: OwnDraw, key: string, attempts: readonly AttemptRow[]): number {
  const made = attempts
    .filter(({ partKey }) => partKey === key)
    .map(({ verdict, text }) => ({
      verdict,
      readable: verdict !== null || readAnswer(content, key, text).readable,
    }));
  return attemptsLeft(set.attemptsAllowed, made);
}

function unreadableOf({ content }: OwnDraw, answers: HandInInput['answers']): { partKey: string; message: string }[] {
  return answers.flatMap(({ partKey, text }) => {
    const reading = readAnswer(content, partKey, text);
    if (reading.readable) return [];
    const fault = reading.diagnostics.find(isFatal);
    const message = [fault?.message ?? 'This cannot be read.', fault?.hint].filter(Boolean).join(' ');
    return [{ partKey, message }];
  });
}

/** What was handed in is also what was saved last, so that an older tab does not bring back an older text. */
async function keepAsSaved(
  { transaction, now }: ServiceContext,
  { draw }: OwnDraw,
  answers: HandInInput['answers'],
): Promise<void> {
  for (const { partKey, text } of answers) {
    const [saved, isNew] = await SavedAnswer.findOrCreate({
      where: { drawId: draw.id, partKey },
      defaults: { drawId: draw.id, partKey, text, savedAt: now },
      transaction,
    });
    if (!isNew && saved.text !== text) {
      await saved.update({ text, revision: saved.revision + 1, savedAt: now }, { transaction });
    }
  }
}

async function standing({ transaction }: ServiceContext, own: OwnDraw, keys: readonly string[]): Promise<HandInResult> {
  const attempts = await attemptsOfDraws([own.draw.id], transaction);
  const saved = await savedAnswers([own.draw.id], transaction);
  const parts = attempts
    .filter((made) => made.stands && keys.includes(made.partKey))
    .map(({ partKey, text, attempt, receipt, submittedAt }) => ({
      partKey,
      text,
      attempt,
      attemptsLeft: leftFor(own, partKey, attempts),
      receipt,
      submittedAt: submittedAt.toISOString(),
      revision: saved.find((row) => row.partKey === partKey)?.revision ?? 0,
    }));
  return { kind: 'handed-in', parts };
}
