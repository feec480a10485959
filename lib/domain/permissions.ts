import type { CourseRole } from './roles';

/**
 * Who may do what in a course. Values:
 * - `yes`: always;
 * - `own-sections`: for the sections one grades, or for all where the course does not say so;
 * - `own-figures`: only what concerns oneself;
 * - `set-policy`: where the set's policy says so.
 * What is not named is refused.
 */
export type Grant = 'yes' | 'own-sections' | 'own-figures' | 'set-policy';

/** The roles of a course, and the administrator, who stands outside it. */
export type Office = CourseRole | 'administrator';

const table = {
  'answer-own-draws': { student: 'yes' },
  'appeal-own-part': { student: 'yes' },
  'try-reading': { student: 'yes', ta: 'yes', 'head-ta': 'yes', instructor: 'yes', administrator: 'yes' },
  'use-check-bench': { ta: 'yes', 'head-ta': 'yes', instructor: 'yes', administrator: 'yes' },
  'take-in-answers': { ta: 'own-sections', 'head-ta': 'yes', instructor: 'yes' },
  'work-queue': { ta: 'own-sections', 'head-ta': 'yes', instructor: 'yes' },
  'view-consistency': { ta: 'own-figures', 'head-ta': 'yes', instructor: 'yes' },
  'settle-disagreements': { 'head-ta': 'yes', instructor: 'yes' },
  'assign-second-marking': { 'head-ta': 'yes', instructor: 'yes' },
  'view-problem-sets': { student: 'yes', ta: 'yes', 'head-ta': 'yes', instructor: 'yes' },
  'edit-problem-sets': { instructor: 'yes' },
  'read-course-templates': { ta: 'yes', 'head-ta': 'yes', instructor: 'yes' },
  'comment-on-templates': { 'head-ta': 'yes', instructor: 'yes' },
  'read-shelf': { 'head-ta': 'yes', instructor: 'yes', administrator: 'yes' },
  'write-shelf': { instructor: 'yes', administrator: 'yes' },
  'see-identities-before-release': { 'head-ta': 'set-policy', instructor: 'yes' },
  'answer-appeals': { ta: 'yes', 'head-ta': 'yes', instructor: 'yes' },
  'export-student-data': { administrator: 'yes' },
  'read-roster': { ta: 'own-sections', 'head-ta': 'yes', instructor: 'yes', administrator: 'yes' },
  'change-roster': { 'head-ta': 'yes', instructor: 'yes', administrator: 'yes' },
  'release-scores': { 'head-ta': 'yes', instructor: 'yes' },
  'export-marks': { 'head-ta': 'yes', instructor: 'yes' },
  'manage-tokens': { 'head-ta': 'yes', instructor: 'yes' },
  'manage-courses': { administrator: 'yes' },
  'manage-accounts': { administrator: 'yes' },
  'read-audit-log': { instructor: 'yes', administrator: 'yes' },
} as const satisfies Record<string, Partial<Record<Office, Grant>>>;

export type Ability = keyof typeof table;

/** Every ability there is, for the test that walks them all. */
export const abilities = Object.keys(table) as Ability[];

/** What an office is granted; null is a refusal. */
export function grantOf(office: Office, ability: Ability): Grant | null {
  const row: Partial<Record<Office, Grant>> = table[ability];
  return row[office] ?? null;
}
