import { type PersonActor } from '@/lib/domain/actor';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { canSeeStudentIdentities } from '@/lib/policies/can-see-student-identities';
import { decide, requireAllowed, sectionBound } from '@/lib/policies/decide';
import type { ScoreReportContent } from '@/lib/presenters/score-report';
import { Membership } from '@/models/membership';
import { ProblemSet } from '@/models/problem-set';
import { SetRelease } from '@/models/set-release';
import {
  appealsOf,
  issuedReports,
  witnessesOf,
  type IssuedReport,
  type OwnAppeal,
  type ReportedWitness,
} from './issued-reports';
import { reportContent } from './report-content';
import { courseForActor, type CourseView } from './course-for-actor';

/** A student's report for the staff: the issued ones, or, before release, what it would be now. */
export type StaffReport = {
  course: CourseView;
  set: { id: string; number: number; title: string };
  /** Null where the set is marked without names until it is released. */
  studentName: string | null;
  content: ScoreReportContent;
  /** Empty for a preview. */
  reports: IssuedReport[];
  appeals: OwnAppeal[];
  witnesses: ReportedWitness[];
};

/**
 * One student's report. Who may release sees it before release as a preview, without the name where the set's policy
 * says so; graders see it after release, of their sections where the course says so.
 */
export async function staffReport(
  actor: PersonActor,
  { courseId, setId, userId }: { courseId: string; setId: string; userId: string },
): Promise<StaffReport> {
  const course = await courseForActor(actor, courseId);
  const grading = decide(actor, 'work-queue', course);
  requireAllowed(grading);
  const set = await ProblemSet.findOne({ where: { id: setId, courseId } });
  const student = await Membership.findOne({ where: { courseId, userId, role: 'student' } });
  if (!set || !student) throw new HalfmarkError('not-found');
  const bound = sectionBound(actor, course, grading);
  if (bound !== null && !(student.sectionId !== null && bound.includes(student.sectionId))) {
    throw new HalfmarkError('forbidden', 'This student is in a section that you do not grade.');
  }
  const whose = { problemSetId: setId, userId };
  const released = (await SetRelease.count({ where: whose })) > 0;
  if (!released) requireAllowed(decide(actor, 'release-scores', course));
  const reports = released ? await issuedReports(whose) : [];
  const content = reports[0]?.content ?? (await reportContent(whose));
  const { headTaSeesIdentities } = setPolicySchema.parse(set.policy);
  const named = canSeeStudentIdentities(actor, course, { released, headTaSeesIdentities }).allowed;
  return {
    course,
    set: { id: set.id, number: set.number, title: set.title },
    studentName: named ? content.student : null,
    content,
    reports,
    appeals: await appealsOf(whose),
    witnesses: await witnessesOf(whose),
  };
}
