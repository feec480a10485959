import { hash, verify } from '@node-rs/argon2';
import { z } from 'zod';

/**
 * Cost of one hash: Argon2id with 19 MiB, two passes, one lane, the second of the equivalent settings in the OWASP
 * password storage cheat sheet (from memory). About 20 ms on the reference machine.
 */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** Verified against when there is no account, or none with a password, so that the answer takes as long. */
let decoy: Promise<string> | undefined;

/** The shortest and longest password that Halfmark takes, in characters. */
export const passwordLength = { min: 12, max: 200 } as const;

/** A password that may be set: long enough, not one character over and over. Length is what makes it strong. */
export const newPasswordSchema = z
  .string()
  .min(passwordLength.min, `Use at least ${passwordLength.min} characters; a few unrelated words do well.`)
  .max(passwordLength.max, `Use at most ${passwordLength.max} characters.`)
  .refine((password) => new Set(password).size >= 5, 'Use at least five different characters.');

/** The hash of a password as a PHC string (`$argon2id$…`) with a fresh salt. */
export async function hashPassword(password: string): Promise<string> {
  return hash(password.normalize('NFKC'), cost);
}

/**
 * Whether a password fits a stored hash. With no hash it takes the same time and is false, so that nobody learns from
 * the clock whether an account exists. A hash that cannot be read is false too.
 */
export async function verifyPassword(stored: string | null, password: string): Promise<boolean> {
  const given = password.normalize('NFKC');
  if (stored === null) {
    decoy ??= hashPassword('no account has this password');
    await verify(await decoy, given);
    return false;
  }
  try {
    return await verify(stored, given);
  } catch {
    return false;
  }
}
