import { z } from 'zod';
import { handleRoute } from '@/app/_server/handle-route';
import { openIntake } from '@/lib/services/open-intake';

const parameters = z.object({ intakeId: z.uuid() });

/** How far an upload has come, for the page that shows it. */
export const GET = handleRoute(async ({ actor, params }) => {
  const { state, rowsTotal, rowsAccepted, rowsCommitted, rowsChecked } = await openIntake(
    actor,
    parameters.parse(params),
  );
  return Response.json(
    { state, rowsTotal, rowsAccepted, rowsCommitted, rowsChecked },
    { headers: { 'cache-control': 'no-store' } },
  );
});
