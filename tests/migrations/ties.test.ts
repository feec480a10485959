import { describe, expect, it } from 'vitest';
import { database } from '@/lib/db/connection';
import { violatedConstraint } from '@/lib/db/constraints';
import { Answer } from '@/models/answer';
import { Appeal } from '@/models/appeal';
import { Membership } from '@/models/membership';
import { Ruling } from '@/models/ruling';
import { SecondMarking } from '@/models/second-marking';
import { Submission } from '@/models/submission';
import { User } from '@/models/user';
import { buildAnswer, buildAnswerCheck, buildCreditEntry, buildSubmission } from '../factories/answers';
import { buildClassroom } from '../factories/classroom';
import { buildQueueItem, buildRuling } from '../factories/marking';
import { buildCourse, buildSection, buildUser } from '../factories/people';
import { buildRelease } from '../factories/problem-sets';

async function refusalOf(work: () => Promise<unknown>): Promise<string | null> {
  try {
    await work();
    return null;
  } catch (error) {
    return violatedConstraint(error);
  }
}

/** A classroom with two students, each with a draw. */
async function twoDraws() {
  const room = await buildClassroom({ students: 2 });
  const [mine, theirs] = room.draws;
  const [ta, otherTa] = room.tas;
  if (!mine || !theirs || !ta || !otherTa) throw new RangeError('There are two students and two TAs.');
  return { ...room, mine, theirs, ta: ta.user, otherTa: otherTa.user };
}

describe('rows that must belong together', () => {
  it('a student’s section is of the same course', async () => {
    const section = await buildSection(await buildCourse());
    const course = await buildCourse();
    const user = await buildUser();
    const join = () =>
      Membership.create({ courseId: course.id, userId: user.id, role: 'student', sectionId: section.id });
    expect(await refusalOf(join)).toBe('memberships_section_fkey');
  });

  it('a submission is by the student whose draw it is', async () => {
    const { mine, theirs } = await twoDraws();
    expect(await refusalOf(() => buildSubmission(mine, { userId: theirs.userId }))).toBe('submissions_draw_fkey');
    expect(await Submission.count({ where: { drawId: mine.id } })).toBe(0);
  });

  it('an answer is in a submission of its own draw', async () => {
    const { mine, theirs } = await twoDraws();
    const submission = await buildSubmission(theirs);
    expect(await refusalOf(() => buildAnswer(mine, { submission }))).toBe('answers_submission_fkey');
  });

  it('an answer’s current check and credit are its own, at the end of the transaction', async () => {
    const { mine, theirs } = await twoDraws();
    const answer = await buildAnswer(mine);
    const other = await buildAnswer(theirs);
    const check = await buildAnswerCheck(other);
    const entry = await buildCreditEntry(other);
    expect(await refusalOf(() => answer.update({ currentCheckId: check.id }))).toBe('answers_current_check_fkey');
    expect(await refusalOf(() => answer.update({ currentCreditEntryId: entry.id }))).toBe(
      'answers_current_credit_entry_fkey',
    );
  });

  it('the pointer to a credit entry may be written before the entry, in one transaction', async () => {
    const { mine } = await twoDraws();
    const answer = await buildAnswer(mine);
    const id = crypto.randomUUID();
    await database().transaction(async (transaction) => {
      await answer.update({ currentCreditEntryId: id }, { transaction });
      await database().query(
        `insert into credit_entries (id, answer_id, credit, out_of, source) values (:id, :answer, 0, 3000, 'automatic')`,
        { transaction, replacements: { id, answer: answer.id } },
      );
    });
    const read = await Answer.findByPk(answer.id, { include: 'currentCredit', rejectOnEmpty: true });
    expect(read.currentCredit?.credit).toBe(0);
  });

  it('a credit entry follows one of the same answer', async () => {
    const { mine, theirs } = await twoDraws();
    const entry = await buildCreditEntry(await buildAnswer(theirs));
    const answer = await buildAnswer(mine);
    expect(await refusalOf(() => buildCreditEntry(answer, { previousEntryId: entry.id }))).toBe(
      'credit_entries_previous_fkey',
    );
  });

  it('a credit entry, a ruling and a second marking are of the same answer', async () => {
    const { mine, theirs, ta, otherTa, problemSet } = await twoDraws();
    const answer = await buildAnswer(mine);
    const other = await buildAnswer(theirs);
    const queueItem = await buildQueueItem(other);
    const ruling = await buildRuling(queueItem, ta);
    expect(await refusalOf(() => buildCreditEntry(answer, { source: 'ruling', rulingId: ruling.id }))).toBe(
      'credit_entries_ruling_fkey',
    );
    expect(await refusalOf(() => buildRuling(queueItem, ta, { answerId: answer.id }))).toBe('rulings_queue_item_fkey');
    const marking = {
      rulingId: ruling.id,
      firstGraderId: ta.id,
      problemSetId: problemSet.id,
      graderId: otherTa.id,
      answerId: answer.id,
    };
    expect(await refusalOf(() => SecondMarking.create(marking))).toBe('second_markings_answer_fkey');
    expect(await Ruling.count({ where: { answerId: answer.id } })).toBe(0);
  });

  it('a second marking cannot hide who marked first', async () => {
    const { mine, ta, otherTa, problemSet, headTa } = await twoDraws();
    const answer = await buildAnswer(mine);
    const ruling = await buildRuling(await buildQueueItem(answer), ta);
    const marking = { rulingId: ruling.id, problemSetId: problemSet.id, answerId: answer.id };
    const own = () => SecondMarking.create({ ...marking, firstGraderId: ta.id, graderId: ta.id });
    const disguised = () => SecondMarking.create({ ...marking, firstGraderId: headTa.user.id, graderId: ta.id });
    expect(await refusalOf(own)).toBe('second_markings_blind_check');
    expect(await refusalOf(disguised)).toBe('second_markings_first_fkey');
    await expect(
      SecondMarking.create({ ...marking, firstGraderId: ta.id, graderId: otherTa.id }),
    ).resolves.toMatchObject({ state: 'assigned' });
  });

  it('an appeal is by the student whose draw it is', async () => {
    const { mine, theirs, problemSet, instructor } = await twoDraws();
    const owner = await User.findByPk(mine.userId, { rejectOnEmpty: true });
    const release = await buildRelease(problemSet, owner, instructor.user);
    const answer = await buildAnswer(mine);
    const appeal = () =>
      Appeal.create({
        setReleaseId: release.id,
        problemSetId: problemSet.id,
        answerId: answer.id,
        drawId: mine.id,
        partKey: 'a',
        userId: theirs.userId,
        reason: 'Please look again.',
      });
    expect(await refusalOf(appeal)).toBe('appeals_draw_fkey');
  });
});
