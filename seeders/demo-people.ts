import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { Course } from '@/models/course';
import { Department } from '@/models/department';
import { Membership } from '@/models/membership';
import { Section } from '@/models/section';
import { SectionGrader } from '@/models/section-grader';
import { User } from '@/models/user';
import { hashPassword } from '@/lib/auth/password';
import type { CourseRole } from '@/lib/domain/roles';
import type { SeededRandom } from '@/lib/templates/seeded-random';
import accounts from './demo-accounts.json';

/** Everyone of the invented course PHY 342 at Wrenfield Institute. */
export type DemoPeople = {
  course: Course;
  instructor: User;
  headTa: User;
  tas: User[];
  students: User[];
};

const givenNames =
  'Ilse Tomas Wanda Emeka Sofia Ravi Greta Malik Yuki Anton Leila Piers Signe Omar Clara Dara Felix Ines Kofi Mina'.split(
    ' ',
  );
const familyNames =
  'Brackenhall Copperdale Dunmarrow Elmsworth Fallowfen Gorsecombe Hazelmere Ivystone Juniperley Kestrelton'.split(' ');

/** Makes the department, the course with four sections, its staff, an administrator and sixty students. */
export async function seedPeople(transaction: Transaction, random: SeededRandom): Promise<DemoPeople> {
  const department = await Department.create({ name: 'Physics, Wrenfield Institute' }, { transaction });
  const course = await Course.create(
    {
      departmentId: department.id,
      code: 'PHY 342',
      title: 'Two-level systems',
      term: 'Autumn 2026',
      timeZone: 'Europe/London',
      notice:
        'Grading, appeals and accommodations follow the rules of Wrenfield Institute; where this page and they differ, they hold.',
    },
    { transaction },
  );
  const sections: Section[] = [];
  for (const name of ['A', 'B', 'C', 'D']) {
    sections.push(await Section.create({ courseId: course.id, name }, { transaction }));
  }
  // The demo's password is public, so one hash serves all: sixty-eight of them would take the better part of a minute.
  const passwordHash = await hashPassword(accounts.password);
  const make = (person: { name: string; email: string; isAdministrator?: boolean }) =>
    User.create({ passwordHash, ...person }, { transaction });
  const join = (user: User, role: CourseRole, section?: Section) =>
    Membership.create(
      { courseId: course.id, userId: user.id, role, sectionId: role === 'student' ? (section?.id ?? null) : null },
      { transaction },
    );

  const named = new Map<string, User[]>();
  for (const { role, name, email } of accounts.accounts) {
    const user = await make({ name, email, isAdministrator: role === 'administrator' });
    named.set(role, [...(named.get(role) ?? []), user]);
  }
  const [instructor] = named.get('instructor') ?? [];
  const [headTa] = named.get('head-ta') ?? [];
  const tas = named.get('ta') ?? [];
  if (!instructor || !headTa) throw new Error('The demo has an instructor and a head TA.');
  await join(instructor, 'instructor');
  await join(headTa, 'head-ta');
  for (const [index, ta] of tas.entries()) {
    const membership = await join(ta, 'ta');
    const section = sections[index % sections.length];
    if (section) {
      await SectionGrader.create(
        { courseId: course.id, sectionId: section.id, membershipId: membership.id },
        { transaction },
      );
    }
  }
  const students = [...(named.get('student') ?? [])];
  for (const name of distinctNames(60 - students.length, random)) {
    students.push(await make({ name, email: `${name.toLowerCase().replace(' ', '.')}@wrenfield.example` }));
  }
  for (const [index, student] of students.entries()) await join(student, 'student', sections[index % sections.length]);
  return { course, instructor, headTa, tas, students };
}

/** So many different pairs of a given and a family name, in an order of the seed's. */
function distinctNames(count: number, random: SeededRandom): string[] {
  const names = new Set<string>();
  while (names.size < count) {
    const given = givenNames[random.below(givenNames.length)];
    const family = familyNames[random.below(familyNames.length)];
    names.add(`${given} ${family}`);
  }
  return [...names];
}

/** A key for a hand-in; its value does not matter, only that it is new. */
export function newClientKey(): string {
  return randomUUID();
}
