import { startSession } from '@/lib/auth/session-store';
import { paths } from '@/lib/paths';
import { callers, type Caller, type OpenRow, type Outcome, type PageRow, type RouteRow } from './row';
import { personOf, type Scene } from './scene';

/** A cookie for each caller, whose session was opened in the database; none for a signed-out one. */
export async function cookiesOf(scene: Scene): Promise<Map<Caller, string>> {
  const cookies = new Map<Caller, string>();
  for (const caller of callers) {
    const person = personOf(scene, caller);
    if (person) cookies.set(caller, `halfmark.session=${await startSession(person.id, new Date())}`);
  }
  return cookies;
}

/** Asks for a page or sends to a route as a browser of our own pages would, and tells what became of it. */
export async function tryOverHttp(
  url: string,
  row: PageRow | RouteRow | OpenRow,
  scene: Scene,
  cookie: string | undefined,
): Promise<Outcome> {
  const method = row.kind === 'route' ? row.method : 'GET';
  const body = row.kind === 'route' ? row.body?.(scene) : undefined;
  const response = await fetch(url + (row.path?.(scene) ?? '/'), {
    method,
    redirect: 'manual',
    headers: {
      ...(cookie ? { cookie } : {}),
      ...(method === 'GET' ? {} : { origin: url }),
      ...(body === undefined || typeof body === 'string' ? {} : { 'content-type': 'application/json' }),
    },
    ...(body === undefined ? {} : { body: typeof body === 'string' ? body : JSON.stringify(body) }),
  });
  const text = await response.text();
  return row.kind === 'page' ? ofPage(response, text) : ofRoute(response);
}

function ofRoute(response: Response): Outcome {
  if (response.status >= 500) throw new Error(`The server failed with ${response.status}.`);
  return ofStatus(response) ?? 'allow';
}

/**
 * A page that streams has sent 200 before it knows; then Next writes what it decided into the page itself, as the digest
 * of an error or as a refresh to another address.
 */
function ofPage(response: Response, html: string): Outcome {
  const byStatus = ofStatus(response);
  if (byStatus) return byStatus;
  if (response.status !== 200) throw new Error(`The page answered ${response.status}.`);
  if (html.includes('NEXT_HTTP_ERROR_FALLBACK;403') || html.includes('<title>Not open to you')) return 'refuse';
  if (html.includes('NEXT_HTTP_ERROR_FALLBACK;404') || html.includes('<title>Nothing here')) return 'hide';
  const refresh = /http-equiv="refresh" content="\d+;url=([^"]*)"/.exec(html)?.[1];
  if (refresh !== undefined) return refresh.startsWith(paths.signIn()) ? 'sign-in' : 'elsewhere';
  if (html.includes('Something failed')) throw new Error('The page failed.');
  return 'allow';
}

function ofStatus(response: Response): Outcome | null {
  if (response.status === 401) return 'sign-in';
  if (response.status === 403) return 'refuse';
  if (response.status === 404) return 'hide';
  if (response.status < 300 || response.status >= 400) return null;
  const target = new URL(response.headers.get('location') ?? '/', 'http://halfmark.invalid');
  return target.pathname === paths.signIn() ? 'sign-in' : 'elsewhere';
}
