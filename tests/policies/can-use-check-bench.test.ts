import { describe, expect, it } from 'vitest';
import { type Actor } from '@/lib/domain/actor';
import { type CourseRole } from '@/lib/domain/roles';
import { canUseCheckBench } from '@/lib/policies/can-use-check-bench';

function person(roles: readonly CourseRole[], isAdministrator = false): Actor {
  const memberships = new Map(
    roles.map((role, index) => [`course-${index}`, { membershipId: `m${index}`, role, sectionIds: [] }]),
  );
  return { kind: 'user', userId: 'u', name: 'Someone', isAdministrator, memberships };
}

const token = (scopes: string[]): Actor => ({ kind: 'token', tokenId: 't', courseId: 'c', scopes });

describe('checking against a reference', () => {
  it.each([
    ['a TA', person(['ta']), true],
    ['an instructor', person(['instructor']), true],
    ['an administrator in no course', person([], true), true],
    ['a token made for it', token(['check-answers']), true],
    ['a token made for something else', token(['export-marks']), false],
    ['a student', person(['student']), false],
    ['a TA who is a student elsewhere', person(['ta', 'student']), false],
    ['an administrator who is a student', person(['student'], true), false],
    ['somebody in no course', person([]), false],
  ])('by %s', (_who, actor, allowed) => {
    expect(canUseCheckBench(actor).allowed).toBe(allowed);
  });
});
