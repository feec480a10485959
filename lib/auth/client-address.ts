/**
 * The address a request came from, for limits only: the last entry of X-Forwarded-For, which the nearest proxy wrote
 * (the web server itself where there is none). Entries before it are whatever the client claimed.
 */
export function clientAddress(headers: Headers | Record<string, string | string[] | undefined>): string {
  const raw = headers instanceof Headers ? headers.get('x-forwarded-for') : headers['x-forwarded-for'];
  const list = Array.isArray(raw) ? raw.join(',') : (raw ?? '');
  const last = list.split(',').at(-1)?.trim() ?? '';
  return last === '' ? 'unknown' : last;
}
