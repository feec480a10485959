import 'server-only';
import { cache } from 'react';
import { type PersonActor } from '@/lib/domain/actor';
import { type Ability } from '@/lib/domain/permissions';
import { decide, requireAllowed, type Decision } from '@/lib/policies/decide';
import { courseForActor, type CourseView } from '@/lib/queries/course-for-actor';
import { requireActor } from './current-actor';
import { idsOf, pageOf } from './page';

/** The course of an address for whoever asks, read once per request; refused as a page where it is not theirs to see. */
export const courseOfPage = cache(async (courseId: string): Promise<{ actor: PersonActor; course: CourseView }> => {
  const actor = await requireActor();
  return pageOf(async () => ({ actor, course: await courseForActor(actor, courseId) }));
});

type Opened<Name extends string> = {
  actor: PersonActor;
  course: CourseView;
  decision: Decision;
  ids: Record<Name | 'courseId', string>;
};

/** Opens a page of a course to those with an ability there; others get the page for a refusal. */
export async function openCoursePage<Name extends string>(
  params: Promise<Record<Name | 'courseId', string>>,
  ability: Ability,
): Promise<Opened<Name>> {
  const ids = await idsOf(params);
  const { actor, course } = await courseOfPage(ids.courseId);
  return pageOf(() => {
    const decision = decide(actor, ability, course);
    requireAllowed(decision);
    return Promise.resolve({ actor, course, decision, ids });
  });
}
