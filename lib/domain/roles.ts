/** The roles a person may hold in a course; one person has one role in a course and may have others elsewhere. */
export const courseRoles = ['student', 'ta', 'head-ta', 'instructor'] as const;

export type CourseRole = (typeof courseRoles)[number];

/** The roles of those who mark and teach: everyone in a course but its students. */
export const staffRoles = ['ta', 'head-ta', 'instructor'] as const satisfies readonly CourseRole[];

const names: Record<CourseRole, string> = {
  student: 'Student',
  ta: 'Teaching assistant',
  'head-ta': 'Head TA',
  instructor: 'Instructor',
};

/** The role as it is written for a person. */
export function roleName(role: CourseRole): string {
  return names[role];
}

/** Whether a role belongs to the staff of a course. */
export function isStaffRole(role: CourseRole): boolean {
  return role !== 'student';
}
