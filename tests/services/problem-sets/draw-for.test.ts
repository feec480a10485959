import { beforeAll, describe, expect, it } from 'vitest';
import { isHalfmarkError, type ErrorCode } from '@/lib/errors';
import { drawFor, drawSet } from '@/lib/services/draw-for';
import { drawValues } from '@/lib/templates/draw-values';
import { Draw } from '@/models/draw';
import { type ProblemSet } from '@/models/problem-set';
import { type ProblemSetItem } from '@/models/problem-set-item';
import { actingAs, actingAsSystem } from '../../factories/context';
import { buildCourseWithPeople, buildMember, type CourseWithPeople } from '../../factories/people';
import { buildItem, buildProblemSet } from '../../factories/problem-sets';

let people: CourseWithPeople;
let set: ProblemSet;
let items: ProblemSetItem[];

beforeAll(async () => {
  people = await buildCourseWithPeople({ students: 6 });
  set = await buildProblemSet(people.course);
  items = [await buildItem(set), await buildItem(set)];
});

const ask = (problemSet: ProblemSet, userId: string, as = userId) => {
  const member = [...people.students, ...people.tas, people.instructor].find(({ user }) => user.id === as);
  return actingAs(member!.user, (context) => drawSet(context, { problemSetId: problemSet.id, userId }));
};

async function codeOf(work: Promise<unknown>): Promise<ErrorCode | null> {
  try {
    await work;
    return null;
  } catch (error) {
    if (!isHalfmarkError(error)) throw error;
    return error.code;
  }
}

describe('drawSet', () => {
  it('draws once for each item and gives the same ever after', async () => {
    const userId = people.students[0]!.user.id;
    const first = await ask(set, userId);
    expect(first.map((drawn) => drawn.itemId)).toEqual(items.map((item) => item.id));
    expect(await ask(set, userId)).toEqual(first);
    const stored = await Draw.findAll({ where: { userId } });
    expect(stored).toHaveLength(2);
    for (const draw of stored) {
      const again = drawValues(first[0]!.content, draw.seed);
      expect(again).toMatchObject({ ok: true, values: draw.drawnValues });
    }
  });

  it('gives two requests at the same moment the same draws', async () => {
    const userId = people.students[1]!.user.id;
    const answers = await Promise.all(Array.from({ length: 8 }, () => ask(set, userId)));
    for (const answer of answers) expect(answer).toEqual(answers[0]);
    expect(await Draw.count({ where: { userId } })).toBe(2);
  });

  it('is the student’s own; graders and jobs may ask for any student', async () => {
    const [one, other] = [people.students[2]!.user.id, people.students[3]!.user.id];
    expect(await codeOf(ask(set, one, other))).toBe('forbidden');
    expect(await codeOf(ask(set, one, people.tas[0]!.user.id))).toBeNull();
    const drawn = await actingAsSystem((context) => drawFor(context, { itemId: items[0]!.id, userId: one }));
    expect(drawn).toMatchObject({ itemId: items[0]!.id, userId: one, points: 9000 });
  });

  it('is not for people outside the course, nor for staff as themselves', async () => {
    const stranger = await buildMember((await buildCourseWithPeople()).course, 'student');
    const attempt = actingAs(stranger.user, (context) =>
      drawSet(context, { problemSetId: set.id, userId: stranger.user.id }),
    );
    expect(await codeOf(attempt)).toBe('not-found');
    expect(await codeOf(ask(set, people.instructor.user.id))).toBe('not-found');
  });

  it('draws nothing before the set has begun', async () => {
    const draft = await buildProblemSet(people.course, { state: 'draft' });
    const coming = await buildProblemSet(people.course, { opensAt: new Date(Date.now() + 3_600_000) });
    const student = people.students[4]!.user.id;
    for (const early of [draft, coming]) {
      await buildItem(early);
      expect(await codeOf(ask(early, student))).toBe('not-found');
      expect(await codeOf(ask(early, student, people.instructor.user.id))).toBe('wrong-state');
    }
    expect(await Draw.count({ where: { userId: student } })).toBe(0);
  });
});
