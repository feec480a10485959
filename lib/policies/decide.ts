import type { Actor, PersonActor } from '@/lib/domain/actor';
import { roleIn } from '@/lib/domain/actor';
import { grantOf, type Ability, type Grant } from '@/lib/domain/permissions';
import { HalfmarkError } from '@/lib/errors';

/** A decision with the grant it rests on, or the refusal with its reason in words. */
export type Decision = { allowed: true; grant: Grant } | { allowed: false; why: string };

/** The little of a course that a decision needs. */
export type CourseForPolicy = { id: string; tasSeeOwnSectionsOnly: boolean };

const refused: Decision = { allowed: false, why: 'You may not do this in this course.' };

/**
 * Decides by the permission table whether an actor has an ability in a course, before any condition on the thing
 * itself. An administrator's own abilities hold in every course; system jobs act with the authority of whoever queued
 * them and are allowed; tokens are decided by their scopes elsewhere and are refused here.
 */
export function decide(actor: Actor, ability: Ability, course: CourseForPolicy): Decision {
  if (actor.kind === 'system') return { allowed: true, grant: 'yes' };
  if (actor.kind === 'token') return refused;
  const role = roleIn(actor, course.id);
  const byRole = role === null ? null : grantOf(role, ability);
  const byOffice = actor.isAdministrator ? grantOf('administrator', ability) : null;
  const grant = byRole === 'yes' || byOffice === null ? byRole : byOffice;
  if (grant === null) return refused;
  if (grant === 'own-sections' && !course.tasSeeOwnSectionsOnly) return { allowed: true, grant: 'yes' };
  return { allowed: true, grant };
}

/** The sections to which a decision confines an actor; null for no such bound. */
export function sectionBound(actor: Actor, course: CourseForPolicy, decision: Decision): readonly string[] | null {
  if (!decision.allowed || decision.grant !== 'own-sections' || actor.kind !== 'user') return null;
  return actor.memberships.get(course.id)?.sectionIds ?? [];
}

/** Throws `forbidden` with the decision's reason unless it allows; returns the grant. */
export function requireAllowed(decision: Decision): Grant {
  if (!decision.allowed) throw new HalfmarkError('forbidden', decision.why);
  return decision.grant;
}

/** Throws `signed-out` unless the actor is a person; returns that person. */
export function requirePerson(actor: Actor): PersonActor {
  if (actor.kind !== 'user') throw new HalfmarkError('signed-out');
  return actor;
}
