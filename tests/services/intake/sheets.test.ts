import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type ErrorCode, isHalfmarkError } from '@/lib/errors';
import { allIntakeRows } from '@/lib/queries/intake-rows';
import { cancelIntake, commitIntake } from '@/lib/services/commit-intake';
import { MAX_SHEET_BYTES } from '@/lib/services/receive-intake';
import { receiveUpload } from '@/lib/uploads/receive-upload';
import { Answer } from '@/models/answer';
import { Intake } from '@/models/intake';
import { IntakeRow } from '@/models/intake-row';
import { StoredFile } from '@/models/stored-file';
import { Submission } from '@/models/submission';
import { buildAnswer } from '../../factories/answers';
import { buildClassroom, type Classroom } from '../../factories/classroom';
import { actingAs } from '../../factories/context';
import { sheetOf, takeIn, uploadSheet } from './take-in-sheet';

const folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-uploads-'));

beforeAll(() => {
  process.env.UPLOADS_DIR = folder;
});

afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** Everything that an upload could leave behind. */
async function traces() {
  return {
    intakes: await Intake.count(),
    rows: await IntakeRow.count(),
    files: await StoredFile.count(),
    submissions: await Submission.count(),
    answers: await Answer.count(),
  };
}

async function refusal(work: Promise<unknown>): Promise<{ code: ErrorCode; message: string }> {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!isHalfmarkError(error)) throw new Error(`Not refused: ${String(error)}`);
  return { code: error.code, message: [error.message, ...Object.values(error.fields)].join(' ') };
}

function at(classroom: Classroom, index: number) {
  const student = classroom.students[index];
  if (!student) throw new RangeError('There is no such student.');
  return student.user;
}

const grader = (classroom: Classroom) => classroom.headTa.user;

async function previewed(classroom: Classroom, content: string | Uint8Array) {
  const id = await uploadSheet(grader(classroom), classroom.problemSet.id, content);
  return Intake.findByPk(id, { rejectOnEmpty: true });
}

describe('what a sheet may be written in', () => {
  it.each([
    ['UTF-8', (text: string) => Buffer.from(text, 'utf8')],
    ['UTF-8 with a mark', (text: string) => Buffer.from(`\uFEFF${text}`, 'utf8')],
    ['UTF-16 LE with a mark', (text: string) => Buffer.from(`\uFEFF${text}`, 'utf16le')],
    ['UTF-16 BE with a mark', (text: string) => Buffer.from(`\uFEFF${text}`, 'utf16le').swap16()],
  ])('%s', async (_name, encode) => {
    const classroom = await buildClassroom({ students: 1 });
    const intake = await previewed(classroom, encode(sheetOf([at(classroom, 0).email, 1, 'a', 'iħ S_z ½'])));
    expect(intake.state).toBe('previewed');
    const [row] = await IntakeRow.findAll({ where: { intakeId: intake.id } });
    expect(row?.text).toBe('iħ S_z ½');
  });
});

describe('what is refused as a whole', () => {
  it.each([
    ['a wrong header', Buffer.from('name,q,answer\r\nx,1,2'), /student/],
    [
      'other bytes, naming the line',
      Buffer.concat([Buffer.from('student,question,part,answer\r\na,1,a,'), Buffer.from([0xff, 0xfe, 0x80])]),
      /line 2/i,
    ],
    ['a quotation mark without its partner', Buffer.from('student,question,part,answer\r\nx,1,a,"2\r\n'), /line/i],
    ['nothing below the header', Buffer.from('student,question,part,answer\r\n'), /no rows/],
  ])('%s', async (_name, content, words) => {
    const classroom = await buildClassroom({ students: 1 });
    const intake = await previewed(classroom, content);
    expect(intake.state).toBe('failed');
    expect(intake.failure).toMatch(words);
    expect(await IntakeRow.count({ where: { intakeId: intake.id } })).toBe(0);
    const { code } = await refusal(
      actingAs(grader(classroom), (context) => commitIntake(context, { intakeId: intake.id, goodRowsOnly: true })),
    );
    expect(code).toBe('wrong-state');
  });

  it('a PDF whatever it is called, naming its true kind', async () => {
    const classroom = await buildClassroom({ students: 1 });
    const before = await traces();
    const pdf = Buffer.from('%PDF-1.7\n%âãÏÓ\n1 0 obj\n<< /Type /Catalog >>\nendobj\n');
    const { code, message } = await refusal(uploadSheet(grader(classroom), classroom.problemSet.id, pdf));
    expect(code).toBe('unsupported-type');
    expect(message).toContain('PDF');
    expect(await traces()).toEqual(before);
  });

  it.each([
    ['announced', true],
    ['not announced', false],
  ])('a file of 50 MB whose size is %s, without keeping a byte of it', async (_name, announced) => {
    const before = await traces();
    const { code, message } = await refusal(receiveUpload(bigUpload(50, announced), MAX_SHEET_BYTES));
    expect(code).toBe('too-large');
    expect(message).toContain('25 MB');
    expect(readdirSync(path.join(folder, 'incoming'))).toEqual([]);
    expect(await traces()).toEqual(before);
  });
});

/** A multipart request with one file of so many megabytes, made as it is read. */
function bigUpload(megabytes: number, announced: boolean): Request {
  const boundary = 'a-boundary-of-ours';
  const head = `--${boundary}\r\nContent-Disposition: form-data; name="file"; filename="big.csv"\r\nContent-Type: text/csv\r\n\r\n`;
  const tail = `\r\n--${boundary}--\r\n`;
  const piece = new TextEncoder().encode('x,1,a,2\n'.repeat(128 * 1024));
  let sent = 0;
  const body = new ReadableStream<Uint8Array>({
    pull(controller) {
      if (sent === 0) controller.enqueue(new TextEncoder().encode(head));
      if (sent < megabytes) controller.enqueue(piece);
      else {
        controller.enqueue(new TextEncoder().encode(tail));
        controller.close();
      }
      sent += 1;
    },
  });
  const headers: Record<string, string> = { 'content-type': `multipart/form-data; boundary=${boundary}` };
  if (announced) headers['content-length'] = String(head.length + megabytes * piece.length + tail.length);
  const init: RequestInit & { duplex: 'half' } = { method: 'POST', body, headers, duplex: 'half' };
  return new Request('http://127.0.0.1/api/intakes', init);
}

describe('rows', () => {
  it('are matched or refused one by one, each with its reason', async () => {
    const classroom = await buildClassroom({ students: 2 });
    const [first, second] = [at(classroom, 0).email, at(classroom, 1).email];
    const intake = await previewed(
      classroom,
      sheetOf(
        [first, 1, 'a', 'i hbar S_z'],
        ['nobody@elsewhere.example', 1, 'a', '1'],
        [second, 9, 'a', '1'],
        [second, 1, 'z', '1'],
        [second, 1, 'b', '  '],
        [first, 1, 'a', 'again'],
        ['', 1, 'a', '1'],
      ),
    );
    const rows = await IntakeRow.findAll({ where: { intakeId: intake.id }, order: ['line'] });
    expect(rows.map(({ line, state, reasonCode }) => [line, state, reasonCode])).toEqual([
      [2, 'accepted', null],
      [3, 'refused', 'unknown-student'],
      [4, 'refused', 'unknown-question'],
      [5, 'refused', 'unknown-part'],
      [6, 'refused', 'empty-answer'],
      [7, 'refused', 'repeated'],
      [8, 'refused', 'no-student'],
    ]);
    expect(rows.filter(({ state }) => state === 'refused').every(({ message }) => (message ?? '').length > 20)).toBe(
      true,
    );
    expect([intake.rowsTotal, intake.rowsAccepted, intake.rowsRefused]).toEqual([7, 1, 6]);
    expect(await Answer.count({ where: { drawId: classroom.draws.map(({ id }) => id) } })).toBe(0);
  });

  it('never overwrite what a student typed: a row becomes a new attempt, and the earlier one is kept', async () => {
    const classroom = await buildClassroom({ students: 1 });
    const [draw] = classroom.draws;
    if (!draw) throw new Error('A classroom has draws.');
    const typed = await buildAnswer(draw, { partKey: 'a', text: 'typed by hand' });
    const intake = await previewed(classroom, sheetOf([at(classroom, 0).email, 1, 'a', 'from the sheet']));
    const [row] = await IntakeRow.findAll({ where: { intakeId: intake.id } });
    expect(row?.message).toBe('Becomes attempt 2; attempt 1 is kept.');
    await takeIn(grader(classroom), intake.id);
    const answers = await Answer.findAll({ where: { drawId: draw.id }, order: ['attempt'] });
    expect(answers.map(({ id, text, attempt, supersededAt }) => [id, text, attempt, supersededAt === null])).toEqual([
      [typed.id, 'typed by hand', 1, false],
      [answers[1]?.id, 'from the sheet', 2, true],
    ]);
  });

  it('with a formula are neutralised in the outcome sheet, and read back as they were', async () => {
    const classroom = await buildClassroom({ students: 1 });
    const { email } = at(classroom, 0);
    const intake = await previewed(
      classroom,
      sheetOf([email, 1, 'a', '=HYPERLINK("x")'], [email, 1, 'b', '-i hbar S_z']),
    );
    const answers: string[] = [];
    for await (const row of allIntakeRows(intake.id)) answers.push(row.answer);
    expect(answers).toEqual(['=HYPERLINK("x")', '-i hbar S_z']);
    const { writeSheet } = await import('@/lib/intake/write-sheet');
    const text = await new Response(
      writeSheet(
        ['answer'],
        answers.map((answer) => [answer]),
      ),
    ).text();
    expect(text).toBe('answer\r\n"\'=HYPERLINK(""x"")"\r\n\'-i hbar S_z\r\n');
    const again = await previewed(classroom, sheetOf([email, 1, 'c', "'-i hbar S_z"]));
    const [row] = await IntakeRow.findAll({ where: { intakeId: again.id } });
    expect(row?.text).toBe('-i hbar S_z');
  });
});

describe('the same file twice', () => {
  it('is refused once it was taken in', async () => {
    const classroom = await buildClassroom({ students: 1 });
    const sheet = sheetOf([at(classroom, 0).email, 1, 'a', '1']);
    await takeIn(grader(classroom), (await previewed(classroom, sheet)).id);
    const before = await traces();
    const { code, message } = await refusal(uploadSheet(grader(classroom), classroom.problemSet.id, sheet));
    expect(code).toBe('conflict');
    expect(message).toContain('This very file was taken in');
    expect(await traces()).toEqual(before);
  });

  it('is taken in once where both were looked at first', async () => {
    const classroom = await buildClassroom({ students: 1 });
    const sheet = sheetOf([at(classroom, 0).email, 1, 'a', '1']);
    const [one, two] = [await previewed(classroom, sheet), await previewed(classroom, sheet)];
    await takeIn(grader(classroom), one.id);
    const before = await traces();
    expect((await refusal(takeIn(grader(classroom), two.id))).code).toBe('conflict');
    expect(await traces()).toEqual(before);
  });
});

describe('who takes in what', () => {
  it('gives up an upload without a trace in any student’s work', async () => {
    const classroom = await buildClassroom({ students: 1 });
    const intake = await previewed(classroom, sheetOf([at(classroom, 0).email, 1, 'a', '1']));
    const before = await traces();
    await actingAs(grader(classroom), (context) => cancelIntake(context, { intakeId: intake.id }));
    expect(await traces()).toEqual(before);
    expect((await refusal(takeIn(grader(classroom), intake.id))).code).toBe('wrong-state');
  });

  it('keeps a TA to their own sections where the course says so', async () => {
    const classroom = await buildClassroom({ students: 2, tas: 2, sections: 2 });
    await classroom.course.update({ tasSeeOwnSectionsOnly: true });
    const ta = classroom.tas[0];
    if (!ta) throw new Error('The classroom has TAs.');
    const sheet = sheetOf([at(classroom, 0).email, 1, 'a', '1'], [at(classroom, 1).email, 1, 'a', '1']);
    const id = await uploadSheet(ta.user, classroom.problemSet.id, sheet);
    const rows = await IntakeRow.findAll({ where: { intakeId: id }, order: ['line'] });
    expect(rows.map(({ state }) => state).sort()).toEqual(['accepted', 'refused']);
    expect(rows.find(({ state }) => state === 'refused')?.reasonCode).toBe('other-section');
  });
});
