import { z } from 'zod';
import { handleRoute } from '@/app/_server/handle-route';
import { deliveriesOf } from '@/lib/queries/deliveries';

/** The deliveries of a set as they are now: what the page about them asks again while mail is under way. */
export const GET = handleRoute(async ({ actor, params }) => {
  const { setId } = z.object({ setId: z.uuid() }).parse(params);
  return Response.json(await deliveriesOf(actor, setId), { headers: { 'cache-control': 'no-store' } });
});
