import { HalfmarkError } from '@/lib/errors';
import { roster, type RosterPerson } from './roster';

/**
 * One person of a course by their membership.
 *
 * @throws HalfmarkError `not-found` for another course's, or for somebody who has left
 */
export async function rosterPerson(courseId: string, membershipId: string): Promise<RosterPerson> {
  const people = await roster(courseId, null);
  const found = people.find((person) => person.membershipId === membershipId);
  if (found === undefined) throw new HalfmarkError('not-found');
  return found;
}
