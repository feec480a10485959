import { describe, expect, it } from 'vitest';
import type { PersonActor } from '@/lib/domain/actor';
import { abilities, grantOf, type Ability, type Office } from '@/lib/domain/permissions';
import { courseRoles, type CourseRole } from '@/lib/domain/roles';
import { canAnswerAppeal } from '@/lib/policies/can-answer-appeal';
import { canReadTemplate } from '@/lib/policies/can-read-template';
import { canSeeStudentIdentities } from '@/lib/policies/can-see-student-identities';
import { canWriteTemplate } from '@/lib/policies/can-write-template';
import { decide, requireAllowed, sectionBound } from '@/lib/policies/decide';
import { isHalfmarkError } from '@/lib/errors';

const course = { id: 'course-1', tasSeeOwnSectionsOnly: false };

function person(role: CourseRole | null, change: Partial<PersonActor> = {}): PersonActor {
  return {
    kind: 'user',
    userId: 'user-1',
    name: 'A Person',
    isAdministrator: false,
    memberships: new Map(role ? [[course.id, { membershipId: 'm', role, sectionIds: ['section-1'] }]] : []),
    ...change,
  };
}

/** The permission table written out a second time, by hand: S student, T TA, H head TA, I instructor, A administrator. */
const expected: Record<Ability, string> = {
  'answer-own-draws': 'S',
  'appeal-own-part': 'S',
  'try-reading': 'STHIA',
  'use-check-bench': 'THIA',
  'take-in-answers': 'THI',
  'work-queue': 'THI',
  'view-consistency': 'THI',
  'settle-disagreements': 'HI',
  'assign-second-marking': 'HI',
  'view-problem-sets': 'STHI',
  'edit-problem-sets': 'I',
  'read-course-templates': 'THI',
  'comment-on-templates': 'HI',
  'read-shelf': 'HIA',
  'write-shelf': 'IA',
  'see-identities-before-release': 'HI',
  'answer-appeals': 'THI',
  'export-student-data': 'A',
  'read-roster': 'THIA',
  'change-roster': 'HIA',
  'release-scores': 'HI',
  'export-marks': 'HI',
  'manage-tokens': 'HI',
  'manage-courses': 'A',
  'manage-accounts': 'A',
  'read-audit-log': 'IA',
};

const letters: Record<Office, string> = { student: 'S', ta: 'T', 'head-ta': 'H', instructor: 'I', administrator: 'A' };

describe('the permission table', () => {
  it.each(abilities)('grants %s to whom it should, and to nobody else', (ability) => {
    for (const office of [...courseRoles, 'administrator'] as const) {
      expect(grantOf(office, ability) !== null, `${office} ${ability}`).toBe(
        expected[ability].includes(letters[office]),
      );
    }
  });

  it('refuses a person without a role, a member of another course, and tokens', () => {
    for (const ability of abilities) {
      expect(decide(person(null), ability, course).allowed).toBe(false);
      expect(decide(person('instructor'), ability, { ...course, id: 'course-2' }).allowed).toBe(false);
      expect(
        decide({ kind: 'token', tokenId: 't', courseId: course.id, scopes: ['checks'] }, ability, course).allowed,
      ).toBe(false);
    }
  });

  it('confines a TA to own sections only where the course says so', () => {
    const narrow = { ...course, tasSeeOwnSectionsOnly: true };
    expect(decide(person('ta'), 'work-queue', course)).toEqual({ allowed: true, grant: 'yes' });
    const bound = decide(person('ta'), 'work-queue', narrow);
    expect(bound).toEqual({ allowed: true, grant: 'own-sections' });
    expect(sectionBound(person('ta'), narrow, bound)).toEqual(['section-1']);
    expect(sectionBound(person('head-ta'), narrow, decide(person('head-ta'), 'work-queue', narrow))).toBeNull();
  });

  it('gives an administrator who also has a role the wider of the two', () => {
    const both = person('ta', { isAdministrator: true });
    expect(decide(both, 'read-roster', { ...course, tasSeeOwnSectionsOnly: true })).toEqual({
      allowed: true,
      grant: 'yes',
    });
    expect(decide(both, 'work-queue', course).allowed).toBe(true);
    expect(decide(person(null, { isAdministrator: true }), 'work-queue', course).allowed).toBe(false);
  });

  it('turns a refusal into an error with its reason', () => {
    try {
      requireAllowed(decide(person('student'), 'work-queue', course));
      expect.unreachable();
    } catch (error) {
      expect(isHalfmarkError(error, 'forbidden')).toBe(true);
    }
  });
});

describe('policies with conditions', () => {
  const template = { departmentCourseIds: ['course-1', 'course-2'], usedInCourseIds: ['course-2'] };

  it('close a template to whoever is a student where it is used', () => {
    const studentElsewhere = person('instructor', {
      memberships: new Map([
        ['course-1', { membershipId: 'a', role: 'instructor', sectionIds: [] }],
        ['course-2', { membershipId: 'b', role: 'student', sectionIds: [] }],
      ]),
    });
    expect(canReadTemplate(studentElsewhere, template).allowed).toBe(false);
    expect(canWriteTemplate(studentElsewhere, template).allowed).toBe(false);
    expect(canReadTemplate({ ...studentElsewhere, isAdministrator: true }, template).allowed).toBe(false);
  });

  it('let instructors write, the head TA read, a TA read only what their course uses, a student nothing', () => {
    expect(canWriteTemplate(person('instructor'), template).allowed).toBe(true);
    expect(canWriteTemplate(person('head-ta'), template).allowed).toBe(false);
    expect(canReadTemplate(person('head-ta'), template).allowed).toBe(true);
    expect(canReadTemplate(person('ta'), template).allowed).toBe(false);
    expect(canReadTemplate(person('ta'), { ...template, usedInCourseIds: ['course-1'] }).allowed).toBe(true);
    expect(canReadTemplate(person('student'), { ...template, usedInCourseIds: [] }).allowed).toBe(false);
  });

  it('have an appeal answered by another grader where there is one', () => {
    const first = { firstGraderIds: ['user-1'], anotherGraderExists: true };
    expect(canAnswerAppeal(person('ta'), course, first).allowed).toBe(false);
    expect(canAnswerAppeal(person('ta'), course, { ...first, anotherGraderExists: false }).allowed).toBe(true);
    expect(canAnswerAppeal(person('ta'), course, { ...first, firstGraderIds: ['user-2'] }).allowed).toBe(true);
    expect(canAnswerAppeal(person('student'), course, { ...first, firstGraderIds: [] }).allowed).toBe(false);
  });

  it('hide names before release from all but the instructor, and the head TA where the set says so', () => {
    const hidden = { released: false, headTaSeesIdentities: false };
    expect(canSeeStudentIdentities(person('ta'), course, hidden).allowed).toBe(false);
    expect(canSeeStudentIdentities(person('head-ta'), course, hidden).allowed).toBe(false);
    expect(canSeeStudentIdentities(person('head-ta'), course, { ...hidden, headTaSeesIdentities: true }).allowed).toBe(
      true,
    );
    expect(canSeeStudentIdentities(person('instructor'), course, hidden).allowed).toBe(true);
    expect(canSeeStudentIdentities(person('ta'), course, { ...hidden, released: true }).allowed).toBe(true);
  });
});
