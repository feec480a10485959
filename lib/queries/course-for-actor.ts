import { type Transaction } from 'sequelize';
import { type Actor } from '@/lib/domain/actor';
import { HalfmarkError } from '@/lib/errors';
import { Course } from '@/models/course';

/** A course as pages and services need it; it also is what policies ask for. Times of the course are told in `timeZone`. */
export type CourseView = {
  id: string;
  departmentId: string;
  code: string;
  title: string;
  term: string;
  timeZone: string;
  tasSeeOwnSectionsOnly: boolean;
  retentionMonths: number;
  notice: string;
};

/**
 * The course with that id for somebody who may know of it: its members, administrators, a token made for it, the system.
 * To everybody else, and for an id of nothing, it is not there.
 *
 * @throws HalfmarkError `not-found`
 */
export async function courseForActor(actor: Actor, courseId: string, transaction?: Transaction): Promise<CourseView> {
  const course = mayKnowOf(actor, courseId) ? await Course.findByPk(courseId, { transaction }) : null;
  if (course === null) throw new HalfmarkError('not-found');
  return {
    id: course.id,
    departmentId: course.departmentId,
    code: course.code,
    title: course.title,
    term: course.term,
    timeZone: course.timeZone,
    tasSeeOwnSectionsOnly: course.tasSeeOwnSectionsOnly,
    retentionMonths: course.retentionMonths,
    notice: course.notice,
  };
}

function mayKnowOf(actor: Actor, courseId: string): boolean {
  switch (actor.kind) {
    case 'system':
      return true;
    case 'token':
      return actor.courseId === courseId;
    case 'user':
      return actor.isAdministrator || actor.memberships.has(courseId);
  }
}
