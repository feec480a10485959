import { z } from 'zod';
import { handleRoute } from '@/app/_server/handle-route';
import { answerColumns } from '@/lib/intake/read-answer-rows';
import { sheetResponse, writeSheet } from '@/lib/intake/write-sheet';
import { blankSheet } from '@/lib/services/blank-sheet';

const query = z.object({ set: z.uuid() });

/** An answer sheet of a set with students, questions and parts filled in, to be completed and uploaded. */
export const GET = handleRoute(async ({ request, actor }) => {
  const { set } = query.parse(Object.fromEntries(new URL(request.url).searchParams));
  const { number, rows } = await blankSheet(actor, set);
  return sheetResponse(writeSheet(answerColumns, rows), `answers-set-${number}.csv`);
});
