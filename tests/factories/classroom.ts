import { type Draw } from '@/models/draw';
import { type ProblemSet } from '@/models/problem-set';
import { type ProblemSetItem } from '@/models/problem-set-item';
import { type TemplateVersion } from '@/models/template-version';
import { buildDraw } from './answers';
import { buildCourseWithPeople, times, type CourseWithPeople } from './people';
import { buildItem, buildProblemSet } from './problem-sets';
import { buildTemplateVersion } from './templates';

/** A course at work: everyone in it, one open set with one item of three parts, and a draw for each student, in order. */
export type Classroom = CourseWithPeople & {
  templateVersion: TemplateVersion;
  problemSet: ProblemSet;
  item: ProblemSetItem;
  draws: Draw[];
};

export async function buildClassroom(
  options: Parameters<typeof buildCourseWithPeople>[0] & { problemSet?: Parameters<typeof buildProblemSet>[1] } = {},
): Promise<Classroom> {
  const people = await buildCourseWithPeople(options);
  const templateVersion = await buildTemplateVersion({
    departmentId: people.course.departmentId,
    publishedBy: people.instructor.user.id,
  });
  const problemSet = await buildProblemSet(people.course, options.problemSet);
  const item = await buildItem(problemSet, { templateVersion });
  const { students } = people;
  const draws = await times(students.length, (index) => {
    const student = students[index];
    if (student === undefined) throw new RangeError('There is a draw for each student.');
    return buildDraw(item, student.user);
  });
  return { ...people, templateVersion, problemSet, item, draws };
}
