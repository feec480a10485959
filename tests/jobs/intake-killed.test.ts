import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { commitIntake } from '@/lib/services/commit-intake';
import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { Intake } from '@/models/intake';
import { buildClassroom } from '../factories/classroom';
import { actingAs } from '../factories/context';
import { until } from '../queue/worker-process';
import { sheetOf, uploadSheet } from '../services/intake/take-in-sheet';
import { killAll, kill, startRealWorker } from './real-worker';

const folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-uploads-'));

beforeAll(() => {
  process.env.UPLOADS_DIR = folder;
});
afterEach(killAll);
afterAll(() => rmSync(folder, { recursive: true, force: true }));

const ROWS = 2000;
const written = ['i hbar S_z', '2 sigma_x', 'hbar (', 'ħω/2, −ħω/2', '3 hbar omega/2'];

describe('a worker killed in the midst of an intake of 2,000 rows', () => {
  it('while rows are taken in and while they are checked: every answer has exactly one verdict, none is lost', async () => {
    const classroom = await buildClassroom({ students: Math.ceil(ROWS / 3) });
    const rows = classroom.students.flatMap(({ user }, index) =>
      ['a', 'b', 'c'].map((part, at) => [user.email, 1, part, written[(index + at) % written.length] ?? '0'] as const),
    );
    const head = classroom.headTa.user;
    const intakeId = await uploadSheet(head, classroom.problemSet.id, sheetOf(...rows.slice(0, ROWS)));
    await actingAs(head, (context) => commitIntake(context, { intakeId, goodRowsOnly: true }));
    const intake = () => Intake.findByPk(intakeId, { rejectOnEmpty: true });
    const committed = async () => (await intake()).rowsCommitted;

    const first = await startRealWorker();
    await until(async () => (await committed()) > 0, 'the first rows are taken in', 30_000);
    await kill(first);
    expect(await committed()).toBeLessThan(ROWS);

    const second = await startRealWorker();
    await until(async () => (await AnswerCheck.count()) > ROWS / 3, 'a third of the verdicts are stored', 60_000);
    await kill(second);
    expect(await AnswerCheck.count()).toBeLessThan(ROWS);

    await startRealWorker();
    await until(async () => (await intake()).state === 'done', 'the intake is done', 90_000);
    expect(await Answer.count()).toBe(ROWS);
    expect(await AnswerCheck.count()).toBe(ROWS);
    expect(await AnswerCheck.count({ distinct: true, col: 'answerId' })).toBe(ROWS);
    expect(await Answer.count({ where: { checkState: 'checked' } })).toBe(ROWS);
    // No row was taken in twice: each is the first attempt at its part.
    expect(await Answer.count({ where: { attempt: 1, supersededAt: null } })).toBe(ROWS);
    const { rowsTotal, rowsAccepted, rowsRefused, rowsCommitted, rowsChecked } = await intake();
    expect({ rowsTotal, rowsAccepted, rowsRefused, rowsCommitted, rowsChecked }).toEqual({
      rowsTotal: ROWS,
      rowsAccepted: ROWS,
      rowsRefused: 0,
      rowsCommitted: ROWS,
      rowsChecked: ROWS,
    });
  }, 240_000);
});
