/**
 * A path of our own to go to after signing in, from a value that anyone may have put into the address: anything that
 * could lead to another site, or back to the sign-in page, becomes `/`.
 */
export function safeNext(value: unknown): string {
  if (typeof value !== 'string' || !value.startsWith('/') || value.length > 2000) return '/';
  const base = 'http://halfmark.invalid';
  const url = URL.canParse(value, base) ? new URL(value, base) : null;
  if (url === null || url.origin !== base || /[\\\p{Cc}]/u.test(value)) return '/';
  const path = url.pathname + url.search;
  return path.startsWith('//') || path.startsWith('/sign-in') || path.startsWith('/api/') ? '/' : path;
}
