import { readReadiness } from '@/lib/queries/read-readiness';

export const dynamic = 'force-dynamic';

/** Says whether requests can be served: 200 when database, migrations and queue are as they must be, else 503. */
export async function GET(): Promise<Response> {
  const checks = await readReadiness();
  const ready = Object.values(checks).every(Boolean);
  return Response.json(
    { status: ready ? 'ready' : 'not ready', checks },
    { status: ready ? 200 : 503, headers: { 'cache-control': 'no-store' } },
  );
}
