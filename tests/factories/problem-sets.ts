import { type CreationAttributes } from 'sequelize';
import { defaultSetPolicy, type SetPolicy } from '@/lib/domain/set-policy';
import { type Course } from '@/models/course';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { SetRelease } from '@/models/set-release';
import { type TemplateVersion } from '@/models/template-version';
import { type User } from '@/models/user';
import { nextNumber } from './next-number';
import { buildTemplateVersion } from './templates';

const day = 86_400_000;

/** An open set, from yesterday to a week from now; `policy` is laid over the default one. */
export function buildProblemSet(
  course: Course,
  overrides: Partial<Omit<CreationAttributes<ProblemSet>, 'policy'>> & { policy?: Partial<SetPolicy> } = {},
): Promise<ProblemSet> {
  const now = Date.now();
  const number = nextNumber();
  return ProblemSet.create({
    courseId: course.id,
    number,
    title: `Problem set ${number}`,
    state: 'open',
    opensAt: new Date(now - day),
    closesAt: new Date(now + 7 * day),
    appealsUntil: new Date(now + 21 * day),
    ...overrides,
    policy: { ...defaultSetPolicy, ...overrides.policy },
  });
}

/** The next item of a set; of a template version of its own unless `templateVersion` says which. Points are thousandths. */
export async function buildItem(
  problemSet: ProblemSet,
  options: { templateVersion?: TemplateVersion; points?: number } = {},
): Promise<ProblemSetItem> {
  const templateVersion = options.templateVersion ?? (await buildTemplateVersion());
  return ProblemSetItem.create({
    problemSetId: problemSet.id,
    position: (await ProblemSetItem.count({ where: { problemSetId: problemSet.id } })) + 1,
    templateVersionId: templateVersion.id,
    points: options.points ?? 9000,
  });
}

/** That a student's scores are out. */
export function buildRelease(problemSet: ProblemSet, student: User, releasedBy: User): Promise<SetRelease> {
  return SetRelease.create({
    problemSetId: problemSet.id,
    userId: student.id,
    releasedAt: new Date(),
    releasedBy: releasedBy.id,
  });
}
