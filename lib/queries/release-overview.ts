import { type PersonActor } from '@/lib/domain/actor';
import { canSeeStudentIdentities } from '@/lib/policies/can-see-student-identities';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor, type CourseView } from './course-for-actor';
import { releaseState, type ReleaseRow } from './release-state';
import { setForStaff, type SetForStaff } from './set-for-staff';
import { waitingParts, type WaitingPart } from './waiting-parts';

/** A student in the list of a release; named only where the releaser may know whose answers a preview shows. */
export type ReleaseStudent = Omit<ReleaseRow, 'name'> & { label: string };

/** Everything to know before releasing a set. */
export type ReleaseOverview = {
  course: CourseView;
  set: SetForStaff;
  students: ReleaseStudent[];
  waiting: WaitingPart[];
  /** Whether `label` is a name, or a number because the set is marked without names until it is released. */
  named: boolean;
};

/** Where a set stands before release, for those who may release its scores. */
export async function releaseOverview(
  actor: PersonActor,
  { courseId, setId }: { courseId: string; setId: string },
  now: Date,
): Promise<ReleaseOverview> {
  const course = await courseForActor(actor, courseId);
  requireAllowed(decide(actor, 'release-scores', course));
  const set = await setForStaff(courseId, setId);
  const [rows, waiting] = await Promise.all([releaseState(setId, now), waitingParts(setId)]);
  const { headTaSeesIdentities } = set.policy;
  const named = canSeeStudentIdentities(actor, course, { released: false, headTaSeesIdentities }).allowed;
  return { course, set, students: named ? rows.map(withName) : rows.sort(byId).map(withNumber), waiting, named };
}

/** An order that has nothing to do with names, so that a number does not tell one. */
const byId = (a: ReleaseRow, b: ReleaseRow) => a.userId.localeCompare(b.userId);

const withName = ({ name, ...row }: ReleaseRow): ReleaseStudent => ({ ...row, label: name });

function withNumber({ name, ...row }: ReleaseRow, index: number): ReleaseStudent {
  return { ...row, label: row.releasedAt === null ? `Student ${index + 1}` : name };
}
