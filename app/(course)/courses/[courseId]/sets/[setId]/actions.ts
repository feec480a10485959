'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { parseCredit } from '@/lib/domain/credit';
import { paths } from '@/lib/paths';
import { closeProblemSet } from '@/lib/services/close-problem-set';
import { type ServiceContext } from '@/lib/services/context';
import { editProblemSet } from '@/lib/services/edit-problem-set';
import { addItem, orderItems, removeItem, setItemPoints } from '@/lib/services/edit-set-items';
import { openProblemSet } from '@/lib/services/open-problem-set';
import { reopenProblemSet } from '@/lib/services/reopen-problem-set';
import { planFormSchema, planOfForm, timeOfForm } from './_components/plan-form-input';

type Result = Promise<ActionResult<unknown>>;

/** Every form names its course and set, and the revision that the person saw. */
const ofSet = z.object({ courseId: z.uuid(), problemSetId: z.uuid(), revision: z.coerce.number().int().positive() });

const points = z.string().transform((typed, context) => {
  const credit = parseCredit(typed);
  if (credit === null || credit === 0) {
    context.addIssue({ code: 'custom', message: 'Write marks above zero, with a point and at most three decimals.' });
    return z.NEVER;
  }
  return credit;
});

/** Opens a draft, at once or at its opening time. */
export async function openSet(form: FormData): Result {
  return change(ofSet, form, openProblemSet);
}

/** Closes an open set now. */
export async function closeSetNow(form: FormData): Result {
  return change(ofSet, form, closeProblemSet);
}

/** Opens a closed set again until a later time of the course's zone. */
export async function reopenSet(form: FormData): Result {
  return change(ofSet.extend({ closesAt: z.string() }), form, async (context, input) => {
    const closesAt = await timeOfForm(context, input.courseId, 'closesAt', input.closesAt);
    return reopenProblemSet(context, { ...input, closesAt });
  });
}

/** Saves title, times, attempts and policy. */
export async function savePlan(form: FormData): Result {
  return change(ofSet.extend(planFormSchema.shape), form, async (context, input) =>
    editProblemSet(context, { ...input, ...(await planOfForm(context, input)) }),
  );
}

/** Puts a question at the end of the set. */
export async function addQuestion(form: FormData): Result {
  const schema = ofSet.extend({ templateVersionId: z.uuid('Choose a question.'), points });
  return change(schema, form, addItem);
}

/** Changes the points of one question. */
export async function changePoints(form: FormData): Result {
  return change(ofSet.extend({ itemId: z.uuid(), points }), form, setItemPoints);
}

/** Takes a question out. */
export async function removeQuestion(form: FormData): Result {
  return change(ofSet.extend({ itemId: z.uuid() }), form, removeItem);
}

/** Puts the questions into the order that the form names. */
export async function orderQuestions(form: FormData): Result {
  const itemIds = z.string().transform((ids) => ids.split(' '));
  return change(ofSet.extend({ itemIds: itemIds.pipe(z.array(z.uuid()).min(1).max(999)) }), form, orderItems);
}

async function change<Schema extends typeof ofSet>(
  schema: Schema,
  form: FormData,
  service: (context: ServiceContext, input: z.output<Schema>) => Promise<unknown>,
): Result {
  const result = await runAction(schema, form, async (context, input) => {
    await service(context, input);
    return { courseId: input.courseId, problemSetId: input.problemSetId };
  });
  if (result.ok) revalidatePath(paths.set(result.value.courseId, result.value.problemSetId));
  return result;
}
