export const dynamic = 'force-dynamic';

/** Says that the web server answers; asks nothing of the database. */
export function GET(): Response {
  return Response.json({ status: 'ok' }, { headers: { 'cache-control': 'no-store' } });
}
