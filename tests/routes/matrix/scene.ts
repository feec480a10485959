import { type Actor } from '@/lib/domain/actor';
import { loadActor } from '@/lib/auth/load-actor';
import { type Template } from '@/models/template';
import { Template as TemplateModel } from '@/models/template';
import { type User } from '@/models/user';
import { buildClassroom, type Classroom } from '../../factories/classroom';
import { buildAdministrator, buildCourseWithPeople, buildUser, type Member } from '../../factories/people';
import { type Caller } from './row';

/**
 * What every row is tried on: a course with one open set of one question, everyone in it, somebody of another course in
 * another department, and an administrator. `student` is in the section that `ta` grades. Rows that need more build it in
 * `extras`.
 */
export type Scene = Classroom & {
  ta: Member;
  student: Member;
  template: Template;
  administrator: User;
  stranger: User;
  strangersCourseId: string;
  /** An account in no course. */
  bystander: User;
  /** What rows built beforehand, by a name of theirs. */
  extras: Record<string, string>;
};

/** Builds the scene in the database that `DATABASE_URL` names. */
export async function buildScene(): Promise<Scene> {
  const classroom = await buildClassroom({ sections: 2, tas: 2, students: 4 });
  const elsewhere = await buildCourseWithPeople();
  const [ta, student] = [classroom.tas[0], classroom.students[0]];
  const template = await TemplateModel.findByPk(classroom.templateVersion.templateId);
  if (ta === undefined || student === undefined || template === null) throw new Error('A classroom has them all.');
  return {
    ...classroom,
    ta,
    student,
    template,
    administrator: await buildAdministrator(),
    stranger: elsewhere.instructor.user,
    strangersCourseId: elsewhere.course.id,
    bystander: await buildUser(),
    extras: {},
  };
}

/** The person that a caller is in the scene; null for a signed-out one. */
export function personOf(scene: Scene, caller: Caller): User | null {
  switch (caller) {
    case 'signedOut':
      return null;
    case 'student':
      return scene.student.user;
    case 'ta':
      return scene.ta.user;
    case 'headTa':
      return scene.headTa.user;
    case 'instructor':
      return scene.instructor.user;
    case 'administrator':
      return scene.administrator;
    case 'stranger':
      return scene.stranger;
  }
}

/** The actor that a signed-in caller is. */
export async function actorOf(scene: Scene, caller: Exclude<Caller, 'signedOut'>): Promise<Actor> {
  const actor = await loadActor(personOf(scene, caller)?.id ?? '');
  if (actor === null) throw new Error(`${caller} has an account.`);
  return actor;
}
