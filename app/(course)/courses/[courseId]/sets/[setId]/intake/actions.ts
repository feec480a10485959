'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { cancelIntake, commitIntake } from '@/lib/services/commit-intake';

const ofIntake = z.object({ courseId: z.uuid(), problemSetId: z.uuid(), intakeId: z.uuid() });

/** Takes in the good rows of an upload. */
export async function takeIn(form: FormData): Promise<ActionResult<unknown>> {
  const result = await runAction(ofIntake, form, async (context, input) => {
    await commitIntake(context, { intakeId: input.intakeId, goodRowsOnly: true });
    return input;
  });
  return shown(result);
}

/** Gives an upload up before anything of it is taken in. */
export async function giveUp(form: FormData): Promise<ActionResult<unknown>> {
  const result = await runAction(ofIntake, form, async (context, input) => {
    await cancelIntake(context, input);
    return input;
  });
  return shown(result);
}

function shown(result: ActionResult<z.output<typeof ofIntake>>): ActionResult<unknown> {
  if (result.ok) {
    const { courseId, problemSetId, intakeId } = result.value;
    revalidatePath(paths.intake(courseId, problemSetId, intakeId));
  }
  return result;
}
