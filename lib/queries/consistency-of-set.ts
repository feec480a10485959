import { type PersonActor } from '@/lib/domain/actor';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor, type CourseView } from './course-for-actor';
import { secondMarkingsOfSet, type SecondMarkingsOfSet } from './second-markings-of-set';
import { setForStaff, type SetForStaff } from './set-for-staff';

/** What a consistency page rests on. `ownOnly` is the grader to whose own pairs it is confined; null for none. */
export type ConsistencyOfSet = SecondMarkingsOfSet & {
  course: CourseView;
  set: SetForStaff;
  ownOnly: string | null;
  maySettle: boolean;
};

/** The pairs of markings of a set that an actor may see: all, or where the role says so only their own. */
export async function consistencyOfSet(
  actor: PersonActor,
  { courseId, setId }: { courseId: string; setId: string },
): Promise<ConsistencyOfSet> {
  const course = await courseForActor(actor, courseId);
  const grant = requireAllowed(decide(actor, 'view-consistency', course));
  const set = await setForStaff(courseId, setId);
  const ownOnly = grant === 'yes' ? null : actor.userId;
  const markings = await secondMarkingsOfSet({ setId, graderId: ownOnly });
  return { ...markings, course, set, ownOnly, maySettle: decide(actor, 'settle-disagreements', course).allowed };
}
