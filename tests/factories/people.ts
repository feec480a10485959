import { type CreationAttributes } from 'sequelize';
import { type CourseRole } from '@/lib/domain/roles';
import { Course } from '@/models/course';
import { Department } from '@/models/department';
import { Membership } from '@/models/membership';
import { Section } from '@/models/section';
import { SectionGrader } from '@/models/section-grader';
import { User } from '@/models/user';
import { nextNumber } from './next-number';

/** A person in a course. */
export type Member = { user: User; membership: Membership };

/** A person without a password; give `passwordHash` to let them sign in. */
export function buildUser(overrides: Partial<CreationAttributes<User>> = {}): Promise<User> {
  const number = nextNumber();
  return User.create({ email: `person-${number}@wrenfield.example`, name: `Person ${number}`, ...overrides });
}

export function buildAdministrator(): Promise<User> {
  return buildUser({ isAdministrator: true });
}

export function buildDepartment(overrides: Partial<CreationAttributes<Department>> = {}): Promise<Department> {
  return Department.create({ name: `Department ${nextNumber()}`, ...overrides });
}

/** A course in a department of its own, unless `departmentId` says which. */
export async function buildCourse(overrides: Partial<CreationAttributes<Course>> = {}): Promise<Course> {
  const departmentId = overrides.departmentId ?? (await buildDepartment()).id;
  return Course.create({
    code: `PHY ${nextNumber()}`,
    title: 'Two-level systems',
    term: 'Autumn 2026',
    timeZone: 'Europe/London',
    ...overrides,
    departmentId,
  });
}

export function buildSection(course: Course, overrides: Partial<CreationAttributes<Section>> = {}): Promise<Section> {
  return Section.create({ courseId: course.id, name: `Section ${nextNumber()}`, ...overrides });
}

/** A person with a role in a course; a new person unless `user` says who. */
export async function buildMember(
  course: Course,
  role: CourseRole,
  options: { user?: User; section?: Section; name?: string } = {},
): Promise<Member> {
  const user = options.user ?? (await buildUser(options.name === undefined ? {} : { name: options.name }));
  const membership = await Membership.create({
    courseId: course.id,
    userId: user.id,
    role,
    sectionId: role === 'student' ? (options.section?.id ?? null) : null,
  });
  if (role === 'ta' && options.section) await buildSectionGrader(options.section, membership);
  return { user, membership };
}

export function buildSectionGrader(section: Section, membership: Membership): Promise<SectionGrader> {
  return SectionGrader.create({
    courseId: section.courseId,
    sectionId: section.id,
    membershipId: membership.id,
  });
}

/** A course and everyone in it; students are spread over the sections in turn, and so are TAs as their graders. */
export type CourseWithPeople = {
  course: Course;
  sections: Section[];
  instructor: Member;
  headTa: Member;
  tas: Member[];
  students: Member[];
};

export async function buildCourseWithPeople(
  options: { sections?: number; tas?: number; students?: number; course?: Partial<CreationAttributes<Course>> } = {},
): Promise<CourseWithPeople> {
  const course = await buildCourse(options.course);
  const sections = await times(options.sections ?? 1, () => buildSection(course));
  const inTurn = (index: number) => sections[index % sections.length];
  return {
    course,
    sections,
    instructor: await buildMember(course, 'instructor'),
    headTa: await buildMember(course, 'head-ta'),
    tas: await times(options.tas ?? 2, (index) => buildMember(course, 'ta', { section: inTurn(index) })),
    students: await times(options.students ?? 2, (index) => buildMember(course, 'student', { section: inTurn(index) })),
  };
}

/** Does something a number of times, one after the other, so that rows are made in order. */
export async function times<Made>(count: number, make: (index: number) => Promise<Made>): Promise<Made[]> {
  const made: Made[] = [];
  for (let index = 0; index < count; index += 1) made.push(await make(index));
  return made;
}
