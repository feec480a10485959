'use server';

import { revalidatePath } from 'next/cache';
import { z } from 'zod';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { retryDelivery, retryDeliveryInput } from '@/lib/services/retry-delivery';

const form = retryDeliveryInput.extend({ courseId: z.uuid(), problemSetId: z.uuid() });

/** Sends a failed or unconfirmed report again, because a person says so. */
export async function sendAgain(data: FormData): Promise<ActionResult<z.output<typeof form>>> {
  const result = await runAction(form, data, async (context, input) => {
    await retryDelivery(context, { deliveryId: input.deliveryId });
    return input;
  });
  if (result.ok) revalidatePath(paths.deliveries(result.value.courseId, result.value.problemSetId));
  return result;
}
