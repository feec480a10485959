import { type NextAuthOptions } from 'next-auth';
import CredentialsProvider from 'next-auth/providers/credentials';
import { z } from 'zod';
import { environment } from '@/lib/env';
import { log } from '@/lib/log';
import { clientAddress } from './client-address';
import { loadActor } from './load-actor';
import { safeNext } from './safe-next';
import { sessionCookie } from './session-cookie';
import { endSession, readSession, startSession } from './session-store';
import { signInWithPassword } from './sign-in';

/** The error that the sign-in form is handed when there were too many failures; any other means "refused". */
export const tooManyFailures = 'too-many';

const credentialsSchema = z.object({ email: z.string().min(1).max(254), password: z.string().min(1).max(1000) });

/**
 * next-auth's settings. Its `jwt` strategy is the one that passwords need, but no JWT is made: the cookie holds an opaque
 * token, `encode` hands it out, and `decode` looks it up in the sessions table, so that a session can be ended.
 */
export function authOptions(): NextAuthOptions {
  const { appUrl, sessionSecret } = environment();
  const cookie = sessionCookie();
  return {
    secret: sessionSecret,
    useSecureCookies: cookie.options.secure,
    cookies: { sessionToken: { name: cookie.name, options: cookie.options } },
    session: { strategy: 'jwt', maxAge: cookie.maxAgeSeconds },
    pages: { signIn: '/sign-in', signOut: '/', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        name: 'E-mail and password',
        credentials: { email: { label: 'E-mail', type: 'email' }, password: { label: 'Password', type: 'password' } },
        authorize: async (given, request) => {
          const parsed = credentialsSchema.safeParse(given);
          if (!parsed.success) return null;
          const address = clientAddress((request.headers ?? {}) as Record<string, string>);
          const outcome = await signInWithPassword(parsed.data.email, parsed.data.password, address);
          if (outcome.kind === 'too-many') throw new Error(tooManyFailures);
          return outcome.kind === 'welcome' ? { id: outcome.userId, name: outcome.name } : null;
        },
      }),
    ],
    jwt: {
      encode: ({ token }) => Promise.resolve(typeof token?.opaque === 'string' ? token.opaque : ''),
      decode: ({ token }) => (token ? openSession(token) : Promise.resolve(null)),
    },
    callbacks: {
      jwt: async ({ token, user }) => (user ? { ...token, opaque: await startSession(user.id, new Date()) } : token),
      session: ({ token, session }) => ({ user: { name: token.name ?? null }, expires: session.expires }),
      redirect: ({ url }) => new URL(safeNext(ownPath(url, appUrl)), appUrl).toString(),
    },
    events: {
      signOut: async ({ token }) => {
        if (typeof token?.opaque === 'string') await endSession(token.opaque);
      },
    },
    logger: {
      // A cookie whose session has ended is an everyday thing, not a fault.
      error: (code) => (code === 'JWT_SESSION_ERROR' ? log.debug({ code }, 'sign-in') : log.error({ code }, 'sign-in')),
      warn: (code) => log.warn({ code }, 'sign-in'),
      debug: (code) => log.debug({ code }, 'sign-in'),
    },
  };
}

async function openSession(opaque: string) {
  const session = await readSession(opaque, new Date());
  const actor = session && (await loadActor(session.userId));
  return actor ? { sub: actor.userId, name: actor.name, opaque } : null;
}

function ownPath(url: string, appUrl: string): string {
  return url.startsWith(`${appUrl}/`) ? url.slice(appUrl.length) : url;
}
