import { createHmac, timingSafeEqual } from 'node:crypto';
import { z } from 'zod';

/** What a mailed link lets its holder do: set the first password, or a new one. */
export type LinkPurpose = 'invitation' | 'reset';

/** For how long a mailed link works, in hours. */
export const linkLifetimeHours: Record<LinkPurpose, number> = { invitation: 14 * 24, reset: 2 };

const idSchema = z.uuid();

/**
 * The token that stands in a mailed link: the id of a row of link_tokens and its HMAC-SHA-256 under the service's
 * secret, so that ids cannot be guessed or a link for one purpose be used for another. The row holds the expiry and
 * whether it was used.
 */
export function signLink(purpose: LinkPurpose, id: string, secret: string): string {
  return `${id}.${signature(purpose, id, secret)}`;
}

/** The id inside a link's token, or null where the signature does not fit. */
export function readLink(purpose: LinkPurpose, token: string, secret: string): string | null {
  const [id = '', given = '', ...rest] = token.split('.');
  if (rest.length > 0 || !idSchema.safeParse(id).success) return null;
  const expected = Buffer.from(signature(purpose, id, secret));
  const actual = Buffer.from(given);
  return expected.length === actual.length && timingSafeEqual(expected, actual) ? id : null;
}

function signature(purpose: LinkPurpose, id: string, secret: string): string {
  return createHmac('sha256', secret).update(`halfmark link ${purpose} ${id}`).digest('base64url');
}
