import { z } from 'zod';

const zones = new Set(['UTC', ...Intl.supportedValuesOf('timeZone')]);

const words = (what: string, most: number) =>
  z.string().trim().min(1, `Write ${what}.`).max(most, `At most ${most} characters.`);

/** What a course is called and how it runs, as a form hands it in; ticked boxes arrive as `on`. */
export const courseFields = {
  code: words('a code, such as PHY 342', 40),
  title: words('a title', 200),
  term: words('a term', 60),
  timeZone: z
    .string()
    .trim()
    .refine((zone) => zones.has(zone), 'Write a time zone by its place, such as Europe/London.'),
  tasSeeOwnSectionsOnly: z
    .literal(['on', ''])
    .optional()
    .transform((ticked) => ticked === 'on'),
  notice: z.string().trim().max(4000, 'At most 4000 characters.').default(''),
};
