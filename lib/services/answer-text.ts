import { z } from 'zod';

/** Longest text that is stored as an answer; the reader calls a far shorter one unreadable, and a person may still see it. */
export const LONGEST_ANSWER = 20_000;

/** What was typed, as it is stored: line ends are made one kind, the rest stays as typed. */
export const answerText = z
  .string()
  .max(LONGEST_ANSWER, `An answer has at most ${LONGEST_ANSWER.toLocaleString('en')} characters.`)
  .refine((text) => !text.includes('\0'), 'This answer holds a character that cannot be stored (a null). Delete it.')
  .transform((text) => text.replaceAll('\r\n', '\n'));

/** The letter of a part. */
export const partKey = z.string().regex(/^[a-z]$/, 'A part is named by one letter.');
