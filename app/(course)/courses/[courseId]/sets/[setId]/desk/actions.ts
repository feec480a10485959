'use server';

import { redirect } from 'next/navigation';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { parseCredit } from '@/lib/domain/credit';
import { HalfmarkError } from '@/lib/errors';
import { paths } from '@/lib/paths';
import { answerAppeal } from '@/lib/services/answer-appeal';
import { type ServiceContext } from '@/lib/services/context';
import { markSecond } from '@/lib/services/mark-second';
import { nextSecondMarking } from '@/lib/queries/queue-of-set';
import { requirePerson } from '@/lib/policies/decide';
import { escalateQueueItem, releaseQueueItem, renewHold } from '@/lib/services/release-queue-item';
import { ruleOnAnswer } from '@/lib/services/rule-on-answer';
import { settleDisagreement } from '@/lib/services/settle-disagreement';
import { takeNextItem } from '@/lib/services/take-next-item';
import { takeQueueItem } from '@/lib/services/take-queue-item';

const ofSet = z.object({ courseId: z.uuid(), problemSetId: z.uuid() });
const ofItem = ofSet.extend({ queueItemId: z.uuid() });

const credit = z.string().transform((typed, context) => {
  const read = parseCredit(typed.trim());
  if (read !== null) return read;
  context.addIssue({ code: 'custom', message: 'Write the credit in marks, with a point and at most three decimals.' });
  return z.NEVER;
});

const marking = z.object({
  credit,
  comment: z.string().max(8000).default(''),
  millisecondsSpent: z.coerce.number().int().min(0).max(86_400_000).catch(0),
});

/** Takes the next waiting answer of a set and goes to its desk; says so where nothing waits for this grader. */
export async function takeNext(form: FormData): Promise<ActionResult<null>> {
  const result = await runAction(ofSet, form, (context, input) => goOn(context, input));
  if (!result.ok) return result;
  if (result.value.queueItemId !== null) redirect(deskOf(result.value));
  return refusal('Nothing waits for you in this set just now.');
}

/** Takes one answer and goes to its desk. */
export async function takeOne(form: FormData): Promise<ActionResult<null>> {
  const result = await runAction(ofItem, form, async (context, input) => {
    await takeQueueItem(context, input);
    return input;
  });
  if (!result.ok) return result;
  redirect(deskOf(result.value));
}

/** Rules on the answer held, or answers the appeal, and goes on to the next in the same round trip. */
export async function rule(form: FormData): Promise<ActionResult<null>> {
  const schema = ofItem.extend({ ...marking.shape, kind: z.enum(['review', 'appeal']) });
  const result = await runAction(schema, form, async (context, { kind, ...input }) => {
    if (kind === 'appeal') await answerAppeal(context, { ...input, reply: replyOf(input.comment) });
    else await ruleOnAnswer(context, input);
    return goOn(context, input);
  });
  if (!result.ok) return result;
  leave(result.value);
}

/** Puts the answer held back into the queue. */
export async function putBack(form: FormData): Promise<ActionResult<null>> {
  const result = await runAction(ofItem, form, async (context, input) => {
    await releaseQueueItem(context, input);
    return input;
  });
  if (!result.ok) return result;
  redirect(paths.queue(result.value.courseId, result.value.problemSetId));
}

/** Hands the answer held to the head TA with a question, and goes on to the next. */
export async function escalate(form: FormData): Promise<ActionResult<null>> {
  const schema = ofItem.extend({ question: z.string().trim().min(1, 'Say what you would like to know.').max(4000) });
  const result = await runAction(schema, form, async (context, input) => {
    await escalateQueueItem(context, input);
    return goOn(context, input);
  });
  if (!result.ok) return result;
  leave(result.value);
}

/** A sign of life from the desk; tells until when the answer is held now. */
export async function keepHold(queueItemId: string): Promise<ActionResult<{ heldUntil: string }>> {
  return runAction(z.object({ queueItemId: z.uuid() }), { queueItemId }, async (context, input) => {
    const { heldUntil } = await renewHold(context, input);
    return { heldUntil: heldUntil.toISOString() };
  });
}

/** Gives the blind second mark and goes on to the next one assigned. */
export async function giveSecondMark(form: FormData): Promise<ActionResult<null>> {
  const schema = ofSet.extend({ ...marking.shape, secondMarkingId: z.uuid() });
  const result = await runAction(schema, form, async (context, input) => {
    await markSecond(context, input);
    const { userId } = requirePerson(context.actor);
    return { ...input, next: await nextSecondMarking(input.problemSetId, userId, context.transaction) };
  });
  if (!result.ok) return result;
  const { courseId, problemSetId, next } = result.value;
  redirect(next ? paths.secondMarking(courseId, problemSetId, next) : paths.queue(courseId, problemSetId));
}

/** Settles where two markings differ. */
export async function settle(form: FormData): Promise<ActionResult<null>> {
  const schema = ofSet.extend({ ...marking.shape, secondMarkingId: z.uuid() });
  const result = await runAction(schema, form, async (context, input) => {
    await settleDisagreement(context, input);
    return input;
  });
  if (!result.ok) return result;
  redirect(paths.queue(result.value.courseId, result.value.problemSetId));
}

type Onward = { courseId: string; problemSetId: string; queueItemId: string | null };

async function goOn(context: ServiceContext, { courseId, problemSetId }: z.output<typeof ofSet>): Promise<Onward> {
  const next = await takeNextItem(context, { problemSetId });
  return { courseId, problemSetId, queueItemId: next?.queueItemId ?? null };
}

function leave({ courseId, problemSetId, queueItemId }: Onward): never {
  if (queueItemId === null) redirect(`${paths.queue(courseId, problemSetId)}?done=1`);
  redirect(paths.desk(courseId, problemSetId, queueItemId));
}

function deskOf({ courseId, problemSetId, queueItemId }: Onward): string {
  return paths.desk(courseId, problemSetId, queueItemId ?? '');
}

function replyOf(comment: string): string {
  const reply = comment.trim();
  if (reply !== '') return reply;
  throw new HalfmarkError('invalid', undefined, { fields: { comment: 'Give the student a reply.' } });
}

function refusal(message: string): ActionResult<never> {
  return { ok: false, code: 'wrong-state', message, fields: { '': message } };
}
