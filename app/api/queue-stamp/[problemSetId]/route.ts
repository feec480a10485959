import { z } from 'zod';
import { handleRoute } from '@/app/_server/handle-route';
import { watchQueue } from '@/lib/services/watch-queue';

const parameters = z.object({ problemSetId: z.uuid() });

/** Tells a page whether the queue it shows has changed. */
export const GET = handleRoute(async ({ actor, params }) => {
  const { problemSetId } = parameters.parse(params);
  return Response.json({ stamp: await watchQueue(actor, problemSetId) }, { headers: { 'cache-control': 'no-store' } });
});
