import { handleRoute } from '@/app/_server/handle-route';
import { inTransaction } from '@/lib/db/transaction';
import { HalfmarkError } from '@/lib/errors';
import { saveAnswer, saveAnswerInput } from '@/lib/services/save-answer';

/** The longest answer with every character escaped, and its surroundings. */
const LONGEST_BODY = 256 * 1024;

/**
 * Keeps what a student types while they type. A route and not an action, because it must outlive the page (`keepalive`)
 * and may not wait behind other actions of the page.
 */
export const PUT = handleRoute(async ({ request, actor, now }) => {
  const body = await request.text();
  if (body.length > LONGEST_BODY) throw new HalfmarkError('too-large');
  const input = saveAnswerInput.parse(parseJson(body));
  const result = await inTransaction((transaction) => saveAnswer({ actor, transaction, now }, input));
  return Response.json(result, { headers: { 'cache-control': 'no-store' } });
});

function parseJson(body: string): unknown {
  try {
    return JSON.parse(body);
  } catch {
    throw new HalfmarkError('invalid', 'The request is not JSON.');
  }
}
