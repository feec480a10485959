import type { CourseRole } from './roles';

/** What a person is in one course: their role, and the sections they belong to (a student) or grade (a TA). */
export type ActorMembership = { membershipId: string; role: CourseRole; sectionIds: readonly string[] };

/** A signed-in person as read from the database for this one request, by course id. */
export type PersonActor = {
  kind: 'user';
  userId: string;
  name: string;
  isAdministrator: boolean;
  memberships: ReadonlyMap<string, ActorMembership>;
};

/** The service itself, acting in a job; `name` is the job's. */
export type SystemActor = { kind: 'system'; name: string };

/** A caller with an API token, which is good for one course and some scopes. */
export type TokenActor = { kind: 'token'; tokenId: string; courseId: string; scopes: readonly string[] };

export type Actor = PersonActor | SystemActor | TokenActor;

/** The role a person holds in a course; null for none. */
export function roleIn(actor: Actor, courseId: string): CourseRole | null {
  return actor.kind === 'user' ? (actor.memberships.get(courseId)?.role ?? null) : null;
}
