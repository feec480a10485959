import 'server-only';
import { cookies, headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { cache } from 'react';
import { loadActor } from '@/lib/auth/load-actor';
import { safeNext } from '@/lib/auth/safe-next';
import { sessionCookie } from '@/lib/auth/session-cookie';
import { readSession, type OpenSession } from '@/lib/auth/session-store';
import { type PersonActor } from '@/lib/domain/actor';
import { paths } from '@/lib/paths';

/** The session of this request's cookie, read once per request; null for none. */
export const currentSession = cache(async (): Promise<OpenSession | null> => {
  const token = (await cookies()).get(sessionCookie().name)?.value;
  return token ? readSession(token, new Date()) : null;
});

/** The person behind this request with the roles they hold now; null for a signed-out one. */
export const currentActor = cache(async (): Promise<PersonActor | null> => {
  const session = await currentSession();
  return session && loadActor(session.userId);
});

/** The person behind this request of a page; a signed-out one is sent to sign in and comes back here after it. */
export async function requireActor(): Promise<PersonActor> {
  const actor = await currentActor();
  if (actor !== null) return actor;
  const next = safeNext((await headers()).get('x-requested-path'));
  redirect(paths.signIn(next === '/' ? undefined : next));
}
