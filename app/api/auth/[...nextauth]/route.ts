import NextAuth from 'next-auth';
import { type NextRequest } from 'next/server';
import { authOptions } from '@/lib/auth/auth-options';
import { environment } from '@/lib/env';

type Context = { params: Promise<{ nextauth: string[] }> };

/** Signing in and out, by next-auth. */
async function handle(request: NextRequest, context: Context): Promise<Response> {
  const { nextauth } = await context.params;
  // Its door for log lines from any browser is shut: what a stranger sends is no log of ours.
  if (nextauth[0] === '_log') return new Response(null, { status: 204 });
  process.env.NEXTAUTH_URL ??= environment().appUrl;
  return (await NextAuth(request, context, authOptions())) as Response;
}

export { handle as GET, handle as POST };
