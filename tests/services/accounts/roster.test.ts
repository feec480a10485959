import { describe, expect, it } from 'vitest';
import { loadActor } from '@/lib/auth/load-actor';
import { type CourseRole } from '@/lib/domain/roles';
import { roster } from '@/lib/queries/roster';
import { changeMembership } from '@/lib/services/change-membership';
import { createSection } from '@/lib/services/create-section';
import { endMembership } from '@/lib/services/end-membership';
import { inviteToCourse } from '@/lib/services/invite-to-course';
import { resendInvitation } from '@/lib/services/resend-invitation';
import { AuditEvent } from '@/models/audit-event';
import { Draw } from '@/models/draw';
import { type User } from '@/models/user';
import { buildClassroom } from '../../factories/classroom';
import { actingAs } from '../../factories/context';
import { buildAdministrator, buildCourseWithPeople, buildUser, type Member } from '../../factories/people';

const first = (members: readonly Member[]): Member => {
  const member = members[0];
  if (member === undefined) throw new Error('The course has people.');
  return member;
};

const bring = (by: User, courseId: string, email: string, role: CourseRole, sectionIds: string[] = []) =>
  actingAs(by, (context) => inviteToCourse(context, { courseId, email, name: 'Nia Brook', role, sectionIds }));

const move = (by: User, courseId: string, member: Member, role: CourseRole, sectionIds: string[] = []) =>
  actingAs(by, (context) =>
    changeMembership(context, { courseId, membershipId: member.membership.id, role, sectionIds }),
  );

const letGo = (by: User, courseId: string, member: Member) =>
  actingAs(by, (context) => endMembership(context, { courseId, membershipId: member.membership.id }));

describe('bringing a person in', () => {
  it('makes an account by invitation for a newcomer, and none for somebody who has one', async () => {
    const { course, instructor, sections } = await buildCourseWithPeople();
    const sectionIds = sections.map((section) => section.id);
    const known = await buildUser({ passwordHash: 'set' });
    expect(await bring(instructor.user, course.id, 'nia@wrenfield.example', 'student', sectionIds)).toMatchObject({
      invited: true,
    });
    expect(await bring(instructor.user, course.id, known.email, 'ta', sectionIds)).toMatchObject({ invited: false });
    const people = await roster(course.id, null);
    expect(people.find((person) => person.email === 'nia@wrenfield.example')).toMatchObject({
      role: 'student',
      hasPassword: false,
      sections: [{ id: sectionIds[0] }],
    });
    expect(people.find((person) => person.email === known.email)).toMatchObject({ role: 'ta', name: known.name });
  });

  it('refuses somebody who is in already, a closed account, and a section of another course', async () => {
    const { course, instructor, students } = await buildCourseWithPeople();
    const elsewhere = await buildCourseWithPeople();
    const closed = await buildUser({ deactivatedAt: new Date() });
    const foreign = elsewhere.sections.map((section) => section.id);
    const by = instructor.user;
    await expect(bring(by, course.id, first(students).user.email, 'ta')).rejects.toMatchObject({ code: 'conflict' });
    await expect(bring(by, course.id, closed.email, 'ta')).rejects.toMatchObject({ code: 'wrong-state' });
    await expect(bring(by, course.id, 'x@wrenfield.example', 'student', foreign)).rejects.toMatchObject({
      code: 'invalid',
      fields: { sectionIds: expect.any(String) as string },
    });
    expect((await roster(course.id, null)).some((person) => person.email === 'x@wrenfield.example')).toBe(false);
  });

  it('is for those who may change the roster, and only in their course', async () => {
    const { course, tas, students } = await buildCourseWithPeople();
    const elsewhere = await buildCourseWithPeople();
    for (const member of [first(tas), first(students)]) {
      await expect(bring(member.user, course.id, 'y@wrenfield.example', 'student')).rejects.toMatchObject({
        code: 'forbidden',
      });
    }
    await expect(bring(elsewhere.instructor.user, course.id, 'y@wrenfield.example', 'student')).rejects.toMatchObject({
      code: 'not-found',
    });
    expect(await bring(await buildAdministrator(), course.id, 'y@wrenfield.example', 'instructor')).toMatchObject({
      invited: true,
    });
  });

  it('keeps a head TA from making or unmaking those above students and TAs', async () => {
    const { course, headTa, instructor, tas } = await buildCourseWithPeople();
    const by = headTa.user;
    await expect(bring(by, course.id, 'z@wrenfield.example', 'instructor')).rejects.toMatchObject({
      code: 'forbidden',
    });
    await expect(move(by, course.id, first(tas), 'head-ta')).rejects.toMatchObject({ code: 'forbidden' });
    await expect(move(by, course.id, instructor, 'ta')).rejects.toMatchObject({ code: 'forbidden' });
    await expect(letGo(by, course.id, instructor)).rejects.toMatchObject({ code: 'forbidden' });
    await expect(move(by, course.id, headTa, 'ta')).rejects.toMatchObject({ code: 'forbidden' });
    expect(await bring(by, course.id, 'z@wrenfield.example', 'ta')).toMatchObject({ invited: true });
  });
});

describe('changing a person’s place', () => {
  it('counts at once, and the log holds what was and what is', async () => {
    const { course, instructor, tas, sections } = await buildCourseWithPeople({ sections: 2 });
    const ta = first(tas);
    const ids = sections.map((section) => section.id);
    await move(instructor.user, course.id, ta, 'ta', ids);
    const actor = await loadActor(ta.user.id);
    expect(actor?.memberships.get(course.id)?.sectionIds.toSorted()).toEqual(ids.toSorted());
    await move(instructor.user, course.id, ta, 'student', [ids[0] ?? '']);
    expect((await loadActor(ta.user.id))?.memberships.get(course.id)).toMatchObject({
      role: 'student',
      sectionIds: [ids[0]],
    });
    const events = await AuditEvent.findAll({ where: { subjectId: ta.user.id }, order: [['id', 'DESC']] });
    expect(events[0]).toMatchObject({
      action: 'change-membership',
      courseId: course.id,
      details: { role: { from: 'ta', to: 'student' } },
    });
  });

  it('puts a student in one section at most', async () => {
    const { course, instructor, students, sections } = await buildCourseWithPeople({ sections: 2 });
    const ids = sections.map((section) => section.id);
    await expect(move(instructor.user, course.id, first(students), 'student', ids)).rejects.toMatchObject({
      code: 'invalid',
    });
  });

  it('is not for one’s own, and not for a membership of another course', async () => {
    const { course, instructor } = await buildCourseWithPeople();
    const elsewhere = await buildCourseWithPeople();
    await expect(move(instructor.user, course.id, instructor, 'student')).rejects.toMatchObject({ code: 'forbidden' });
    await expect(move(instructor.user, course.id, first(elsewhere.students), 'student')).rejects.toMatchObject({
      code: 'not-found',
    });
  });
});

describe('leaving', () => {
  it('closes the course at once, keeps the work, and lets them come back to it', async () => {
    const { course, instructor, students } = await buildClassroom();
    const student = first(students);
    await letGo(instructor.user, course.id, student);
    expect((await loadActor(student.user.id))?.memberships.has(course.id)).toBe(false);
    expect((await roster(course.id, null)).some((person) => person.userId === student.user.id)).toBe(false);
    expect(await Draw.count({ where: { userId: student.user.id } })).toBe(1);
    await expect(letGo(instructor.user, course.id, student)).rejects.toMatchObject({ code: 'not-found' });
    const back = await bring(instructor.user, course.id, student.user.email, 'student');
    expect(back.membershipId).toBe(student.membership.id);
    expect((await loadActor(student.user.id))?.memberships.get(course.id)?.role).toBe('student');
  });
});

describe('what a TA sees of the roster', () => {
  it('are the students of their sections, and all of the staff', async () => {
    const { course, sections, students } = await buildCourseWithPeople({ sections: 2, students: 4 });
    const own = sections[0]?.id ?? '';
    const seen = await roster(course.id, [own]);
    const ownStudents = students.filter((student) => student.membership.sectionId === own);
    expect(
      seen
        .filter((person) => person.role === 'student')
        .map((person) => person.userId)
        .toSorted(),
    ).toEqual(ownStudents.map((student) => student.user.id).toSorted());
    expect(seen.filter((person) => person.role !== 'student')).toHaveLength(4);
    expect((await roster(course.id, [])).every((person) => person.role !== 'student')).toBe(true);
  });
});

describe('sections and invitations', () => {
  it('have one name each in a course', async () => {
    const { course, headTa } = await buildCourseWithPeople();
    const make = () => actingAs(headTa.user, (context) => createSection(context, { courseId: course.id, name: 'E' }));
    await make();
    await expect(make()).rejects.toMatchObject({ code: 'conflict', fields: { name: expect.any(String) as string } });
  });

  it('are mailed again only to those without a password', async () => {
    const { course, instructor, students } = await buildCourseWithPeople({ students: 1 });
    const student = first(students);
    const again = () =>
      actingAs(instructor.user, (context) =>
        resendInvitation(context, { courseId: course.id, membershipId: student.membership.id }),
      );
    await again();
    await student.user.update({ passwordHash: 'set' });
    await expect(again()).rejects.toMatchObject({ code: 'wrong-state' });
  });
});
