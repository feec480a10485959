import { environment } from '@/lib/env';
import { sessionLifetime } from './session-store';

/**
 * The cookie that holds a session's opaque token. Over https it has the `__Host-` name, which browsers accept only when it
 * is Secure, for the whole site, and set by this host; on plain http (loopback) that name would be refused.
 */
export function sessionCookie() {
  const secure = environment().appUrl.startsWith('https:');
  return {
    name: secure ? '__Host-halfmark.session' : 'halfmark.session',
    options: { httpOnly: true, sameSite: 'lax', path: '/', secure },
    maxAgeSeconds: sessionLifetime.longest / 1000,
  } as const;
}
