import { getSession, signIn } from 'next-auth/react';

/** How a sign-in ended, for the form to say. */
export type SignInResult = 'welcome' | 'refused' | 'too-many' | 'failed';

/**
 * Signs in through next-auth and believes it only when the session is there. With a stale anti-forgery cookie next-auth
 * answers "ok" and makes no session, but its answer leaves a fresh cookie: that case is tried a second time.
 */
export async function signInAndWait(email: string, password: string): Promise<SignInResult> {
  try {
    for (let tries = 0; tries < 2; tries += 1) {
      const answer = await signIn('credentials', { redirect: false, callbackUrl: '/', email, password });
      if (answer?.error === 'too-many') return 'too-many';
      if (answer?.error) return answer.status === 401 ? 'refused' : 'failed';
      if (answer?.url?.endsWith('csrf=true')) continue;
      return (await getSession()) === null ? 'failed' : 'welcome';
    }
  } catch {
    return 'failed';
  }
  return 'failed';
}
