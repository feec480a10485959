import { beforeEach, describe, expect, it } from 'vitest';
import { saveAnswer, saveAnswerInput } from '@/lib/services/save-answer';
import { SavedAnswer } from '@/models/saved-answer';
import { buildClassroom, type Classroom } from '@/tests/factories/classroom';
import { actingAs } from '@/tests/factories/context';

let room: Classroom;

beforeEach(async () => {
  room = await buildClassroom({ students: 2 });
});

function save(text: string, baseRevision: number, who = 0, partKey = 'a') {
  const drawId = room.draws[0]!.id;
  return actingAs(room.students[who]!.user, (context) => saveAnswer(context, { drawId, partKey, text, baseRevision }));
}

describe('keeping what is typed', () => {
  it('counts its revisions and keeps one text a part', async () => {
    expect(await save('S', 0)).toMatchObject({ kind: 'saved', revision: 1 });
    expect(await save('S_x', 1)).toMatchObject({ kind: 'saved', revision: 2 });
    const kept = await SavedAnswer.findAll({ where: { drawId: room.draws[0]!.id } });
    expect(kept.map(({ text, revision }) => [text, revision])).toEqual([['S_x', 2]]);
  });

  it('takes the same save again as the same', async () => {
    await save('S', 0);
    expect(await save('S', 0)).toMatchObject({ kind: 'saved', revision: 1 });
  });

  it('overwrites nothing that another tab has saved meanwhile, and gives it back', async () => {
    await save('from the first tab', 0);
    expect(await save('from the second', 0)).toMatchObject({
      kind: 'changed',
      text: 'from the first tab',
      revision: 1,
    });
    expect((await SavedAnswer.findOne({ where: { drawId: room.draws[0]!.id } }))?.text).toBe('from the first tab');
  });

  it('lets one of two that come together win', async () => {
    const results = await Promise.all([save('one', 0), save('two', 0)]);
    expect(results.map(({ kind }) => kind).sort()).toEqual(['changed', 'saved']);
  });

  it('is for one’s own draw, a part that exists and a set that takes answers', async () => {
    await expect(save('S', 0, 1)).rejects.toMatchObject({ code: 'not-found' });
    await expect(save('S', 0, 0, 'q')).rejects.toMatchObject({ code: 'invalid' });
    await room.problemSet.update({ state: 'closed' });
    await expect(save('S', 0)).rejects.toMatchObject({ code: 'wrong-state' });
  });

  it('refuses at the edge what the database cannot hold', () => {
    const input = { drawId: room.draws[0]!.id, partKey: 'a', baseRevision: 0 };
    expect(saveAnswerInput.safeParse({ ...input, text: 'a\0b' }).success).toBe(false);
    expect(saveAnswerInput.safeParse({ ...input, text: 'x'.repeat(20_001) }).success).toBe(false);
    expect(saveAnswerInput.parse({ ...input, text: 'a\r\nb' }).text).toBe('a\nb');
  });
});
