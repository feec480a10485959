import { describe, expect, it } from 'vitest';
import { type PersonActor } from '@/lib/domain/actor';
import { courseRoles, type CourseRole } from '@/lib/domain/roles';
import { canAnswerDraw } from '@/lib/policies/can-answer-draw';
import { canTryReading } from '@/lib/policies/can-try-reading';

const course = { id: 'course-1', tasSeeOwnSectionsOnly: false };

function person(role: CourseRole | null, isAdministrator = false): PersonActor {
  return {
    kind: 'user',
    userId: 'user-1',
    name: 'A Person',
    isAdministrator,
    memberships: new Map(role ? [[course.id, { membershipId: 'm', role, sectionIds: [] }]] : []),
  };
}

describe('answering a draw', () => {
  it('is for the student whose it is', () => {
    expect(canAnswerDraw(person('student'), course, { userId: 'user-1' }).allowed).toBe(true);
    expect(canAnswerDraw(person('student'), course, { userId: 'user-2' }).allowed).toBe(false);
  });

  it('is for nobody else: staff, former members, administrators, programs, jobs', () => {
    for (const role of courseRoles.filter((each) => each !== 'student')) {
      expect(canAnswerDraw(person(role), course, { userId: 'user-1' }).allowed).toBe(false);
    }
    expect(canAnswerDraw(person(null), course, { userId: 'user-1' }).allowed).toBe(false);
    expect(canAnswerDraw(person(null, true), course, { userId: 'user-1' }).allowed).toBe(false);
    expect(canAnswerDraw({ kind: 'system', name: 'a job' }, course, { userId: 'user-1' }).allowed).toBe(false);
  });
});

describe('trying a reading', () => {
  it('is for everybody in a course, and administrators', () => {
    for (const role of courseRoles) expect(canTryReading(person(role)).allowed).toBe(true);
    expect(canTryReading(person(null, true)).allowed).toBe(true);
    expect(canTryReading(person(null)).allowed).toBe(false);
  });
});
