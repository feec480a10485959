import { createHash, randomBytes } from 'node:crypto';

/** A secret that means nothing but itself: 256 random bits in 43 characters that need no escaping anywhere. */
export function newOpaqueToken(): string {
  return randomBytes(32).toString('base64url');
}

/** What is stored in place of an opaque token: its SHA-256 in 64 hexadecimal digits. */
export function hashOpaqueToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
