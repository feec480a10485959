import { describe, expect, it } from 'vitest';
import { presentOwnSets } from '@/lib/presenters/own-sets';
import { attemptsOfDraws } from '@/lib/queries/attempts-of-draws';
import { extendedUntil } from '@/lib/queries/extended-until';
import { ownSets } from '@/lib/queries/own-sets';
import { Extension } from '@/models/extension';
import { buildAnswer, buildAnswerCheck } from '@/tests/factories/answers';
import { buildClassroom } from '@/tests/factories/classroom';
import { buildItem, buildProblemSet, buildRelease } from '@/tests/factories/problem-sets';

const day = 86_400_000;
const inDays = (days: number) => new Date(Date.now() + days * day);

describe('the list of own sets', () => {
  it('holds the sets that have begun, of the courses where one is a student now, with what is handed in', async () => {
    const { course, problemSet, students, tas, draws } = await buildClassroom({ students: 2 });
    const other = await buildClassroom({ students: 1 });
    await buildProblemSet(course, { state: 'draft', opensAt: null, closesAt: null, appealsUntil: null });
    await buildProblemSet(course, { opensAt: inDays(1), closesAt: inDays(5) });
    await buildAnswer(draws[0]!, { partKey: 'a', text: 'S_x' });
    await buildAnswer(draws[0]!, { partKey: 'a', text: 'S_y' });
    await buildAnswer(draws[1]!, { partKey: 'b', text: '±1' });

    const rows = await ownSets(students[0]!.user.id, new Date());
    expect(rows.map(({ setId, parts, partsHandedIn }) => [setId, parts, partsHandedIn])).toEqual([
      [problemSet.id, 3, 1],
    ]);
    expect(await ownSets(tas[0]!.user.id, new Date())).toEqual([]);
    expect(rows.map(({ setId }) => setId)).not.toContain(other.problemSet.id);
    await students[0]!.membership.update({ leftAt: new Date() });
    expect(await ownSets(students[0]!.user.id, new Date())).toEqual([]);
  });

  it('counts the parts of every question, drawn or not', async () => {
    const { problemSet, students } = await buildClassroom({ students: 1 });
    await buildItem(problemSet);
    expect((await ownSets(students[0]!.user.id, new Date()))[0]?.parts).toBe(6);
  });

  it('is told apart: open the next to close first, being marked, released, an extension opening again', async () => {
    const { course, problemSet, students, instructor } = await buildClassroom({ students: 1 });
    const student = students[0]!.user;
    const closed = { state: 'closed' as const, opensAt: inDays(-9), closesAt: inDays(-2) };
    const marked = await buildProblemSet(course, closed);
    const released = await buildProblemSet(course, { ...closed, closesAt: inDays(-3) });
    await buildRelease(released, student, instructor.user);
    const extended = await buildProblemSet(course, closed);
    const until = inDays(1);
    await Extension.create({
      problemSetId: extended.id,
      userId: student.id,
      closesAt: until,
      grantedBy: instructor.user.id,
    });
    const work = presentOwnSets(await ownSets(student.id, new Date()), new Date());
    expect(work.open.map(({ setId, isExtended }) => [setId, isExtended])).toEqual([
      [extended.id, true],
      [problemSet.id, false],
    ]);
    expect(work.open[0]?.closesAt).toBe(until.toISOString());
    expect(work['being-marked'].map(({ setId }) => setId)).toEqual([marked.id]);
    expect(work.released.map(({ setId }) => setId)).toEqual([released.id]);
  });
});

describe('an extension', () => {
  it('is the latest of one’s own and one’s section’s, and nobody else’s', async () => {
    const { problemSet, sections, students, instructor } = await buildClassroom({ sections: 2, students: 3 });
    const grant = (whom: { userId: string } | { sectionId: string }, closesAt: Date) =>
      Extension.create({ problemSetId: problemSet.id, closesAt, grantedBy: instructor.user.id, ...whom });
    const [first, second, third] = students.map(({ user }) => user.id);
    const [own, ofSection] = [inDays(2), inDays(3)];
    await grant({ userId: first! }, own);
    await grant({ sectionId: sections[0]!.id }, ofSection);
    expect(await extendedUntil(problemSet.id, first!)).toEqual(ofSection);
    expect(await extendedUntil(problemSet.id, second!)).toBeNull();
    expect(await extendedUntil(problemSet.id, third!)).toEqual(ofSection);
  });
});

describe('the attempts of draws', () => {
  it('come in order, with their verdicts and the one that stands', async () => {
    const { draws } = await buildClassroom({ students: 2 });
    await buildAnswerCheck(await buildAnswer(draws[0]!, { partKey: 'a' }), { verdict: 'differs' });
    await buildAnswer(draws[0]!, { partKey: 'a' });
    await buildAnswer(draws[1]!, { partKey: 'a' });
    const rows = await attemptsOfDraws([draws[0]!.id]);
    expect(rows.map(({ attempt, verdict, stands }) => [attempt, verdict, stands])).toEqual([
      [1, 'differs', false],
      [2, null, true],
    ]);
    expect(await attemptsOfDraws([])).toEqual([]);
  });
});
