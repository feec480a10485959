import { z } from 'zod';
import { normaliseEmail } from '@/lib/auth/sign-in';

/** An e-mail address as accounts are kept under: trimmed, lower case, at most 254 characters. */
export const emailField = z
  .string()
  .max(254, 'An e-mail address has at most 254 characters.')
  .transform(normaliseEmail)
  .pipe(z.email('Write an e-mail address, such as name@institute.example.'));

/** A person's name as it is shown to others. */
export const nameField = z.string().trim().min(1, 'Write a name.').max(200, 'A name has at most 200 characters.');
