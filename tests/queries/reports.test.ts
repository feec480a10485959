import { describe, expect, it } from 'vitest';
import { loadActor } from '@/lib/auth/load-actor';
import { ownReport } from '@/lib/queries/own-report';
import { releaseOverview } from '@/lib/queries/release-overview';
import { staffReport } from '@/lib/queries/staff-report';
import { deliveriesOf } from '@/lib/queries/deliveries';
import { releaseScores } from '@/lib/services/release-scores';
import { type User } from '@/models/user';
import { buildAnswerCheck, buildCreditEntry } from '../factories/answers';
import { actingAs } from '../factories/context';
import { answerAt, buildMarkedSet, studentAt, type MarkedSet } from '../factories/marked-set';
import { refusalOf } from '../factories/refusal';

const witness = { values: { omega: '0.73' }, element: '', reference: '1', answer: '-1' };

/** A marked set in which the first student's part a differs, with a witness. */
async function markedWithWitness(options: Parameters<typeof buildMarkedSet>[0] = {}): Promise<MarkedSet> {
  const marked = await buildMarkedSet(options);
  await buildAnswerCheck(answerAt(marked), {
    checkerVersion: 'test-2',
    verdict: 'differs',
    evidence: { test: 'witness', witness },
  });
  await buildCreditEntry(answerAt(marked), { credit: 0 });
  return marked;
}

async function actorOf(user: User) {
  const actor = await loadActor(user.id);
  if (actor === null) throw new Error('This person has an account.');
  return actor;
}

const release = (marked: MarkedSet) =>
  actingAs(marked.headTa.user, (context) =>
    releaseScores(context, { problemSetId: marked.problemSet.id, reportWaitingParts: false }),
  );

describe('a student’s own report', () => {
  it('holds nothing of correctness before release, and report and witness after it', async () => {
    const marked = await markedWithWitness();
    const student = await actorOf(studentAt(marked));
    const before = await ownReport(student, marked.problemSet.id);
    expect(before).toMatchObject({ reports: [], appeals: [], witnesses: [] });
    expect(JSON.stringify(before)).not.toContain('differs');
    await release(marked);
    const after = await ownReport(student, marked.problemSet.id);
    expect(after.reports.map(({ revision, delivery }) => [revision, delivery])).toEqual([[1, 'waiting']]);
    expect(after.witnesses).toEqual([{ answerId: answerAt(marked).id, ...witness }]);
  });

  it('is never another’s', async () => {
    const marked = await markedWithWitness({ students: 2 });
    await release(marked);
    const other = await ownReport(await actorOf(studentAt(marked, 1)), marked.problemSet.id);
    expect(other.witnesses).toEqual([]);
    expect(other.reports[0]?.content.student).toBe(studentAt(marked, 1).name);
    await refusalOf(ownReport(await actorOf(marked.instructor.user), marked.problemSet.id), 'forbidden');
  });
});

describe('a report for the staff', () => {
  const of = (marked: MarkedSet) => ({
    courseId: marked.course.id,
    setId: marked.problemSet.id,
    userId: studentAt(marked).id,
  });

  it('is a preview before release, without the name where the set is marked without names', async () => {
    const marked = await markedWithWitness();
    const blind = await staffReport(await actorOf(marked.headTa.user), of(marked));
    expect(blind).toMatchObject({ studentName: null, reports: [] });
    expect(blind.content.total?.credit).toBe(0);
    const named = await staffReport(await actorOf(marked.instructor.user), of(marked));
    expect(named.studentName).toBe(studentAt(marked).name);
    const ta = await actorOf(marked.tas[0]?.user ?? studentAt(marked));
    await refusalOf(staffReport(ta, of(marked)), 'forbidden');
  });

  it('is for graders after release, of their own sections where the course says so', async () => {
    const marked = await markedWithWitness({ sections: 2, tas: 2, students: 2 });
    await release(marked);
    const [own, other] = await Promise.all(marked.tas.map(({ user }) => actorOf(user)));
    if (!own || !other) throw new RangeError('There are two TAs.');
    expect((await staffReport(other, of(marked))).studentName).toBe(studentAt(marked).name);
    await marked.course.update({ tasSeeOwnSectionsOnly: true });
    expect((await staffReport(own, of(marked))).reports).toHaveLength(1);
    await refusalOf(staffReport(other, of(marked)), 'forbidden');
  });

  it('lists students by number, not by name, to a head TA of a set marked without names', async () => {
    const marked = await markedWithWitness({ students: 3 });
    const ids = { courseId: marked.course.id, setId: marked.problemSet.id };
    const blind = await releaseOverview(await actorOf(marked.headTa.user), ids, new Date());
    expect(blind.named).toBe(false);
    expect(blind.students.map(({ label }) => label)).toEqual(['Student 1', 'Student 2', 'Student 3']);
    expect(JSON.stringify(blind.students)).not.toContain(studentAt(marked).name);
    const named = await releaseOverview(await actorOf(marked.instructor.user), ids, new Date());
    expect(named.students.map(({ label }) => label)).toContain(studentAt(marked).name);
  });
});

describe('the deliveries of a set', () => {
  it('are for who may release', async () => {
    const marked = await markedWithWitness();
    await release(marked);
    const rows = await deliveriesOf(await actorOf(marked.headTa.user), marked.problemSet.id);
    expect(rows.map(({ state, revision, attempts }) => [state, revision, attempts])).toEqual([
      ['waiting', 1, 0],
      ['waiting', 1, 0],
    ]);
    await refusalOf(deliveriesOf(await actorOf(studentAt(marked)), marked.problemSet.id), 'forbidden');
  });
});
