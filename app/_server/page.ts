import 'server-only';
import { forbidden, notFound, redirect } from 'next/navigation';
import { z } from 'zod';
import { isHalfmarkError } from '@/lib/errors';
import { paths } from '@/lib/paths';

/**
 * Runs what a page needs and turns a refusal into the page for it: `not-found` and an id that is none into "nothing
 * here", `forbidden` into "not yours", `signed-out` into signing in. Every other failure goes on to the error page.
 */
export async function pageOf<Value>(load: () => Promise<Value>): Promise<Value> {
  try {
    return await load();
  } catch (error) {
    if (isHalfmarkError(error, 'not-found') || error instanceof z.ZodError) notFound();
    if (isHalfmarkError(error, 'forbidden')) forbidden();
    if (isHalfmarkError(error, 'signed-out')) redirect(paths.signIn());
    throw error;
  }
}

const idSchema = z.uuid();

/** The ids in a page's address, by name; one that is no uuid is answered as nothing there. */
export async function idsOf<Name extends string>(params: Promise<Record<Name, string>>): Promise<Record<Name, string>> {
  const given = await params;
  for (const value of Object.values(given)) if (!idSchema.safeParse(value).success) notFound();
  return given;
}
