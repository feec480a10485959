import { describe, expect, it } from 'vitest';
import { isHalfmarkError } from '@/lib/errors';
import { neutraliseFormula, withoutNeutralising } from '@/lib/intake/neutralise-formula';
import { readAnswerRows, type AnswerRow } from '@/lib/intake/read-answer-rows';

const sheet =
  'student,question,part,answer\nada@wrenfield.example,1,a,"[[1, i], [-i, 1]]"\nben@wrenfield.example,2,b,½ħω\n';

/** The bytes in pieces of a few, so that every boundary falls inside something. */
async function* inPieces(bytes: Uint8Array, size: number): AsyncGenerator<Uint8Array> {
  for (let at = 0; at < bytes.length; at += size) yield await Promise.resolve(bytes.subarray(at, at + size));
}

async function read(bytes: Uint8Array | string, size = 7): Promise<AnswerRow[]> {
  const rows: AnswerRow[] = [];
  const raw = typeof bytes === 'string' ? new TextEncoder().encode(bytes) : bytes;
  for await (const row of readAnswerRows(inPieces(raw, size))) rows.push(row);
  return rows;
}

async function refusal(bytes: Uint8Array | string): Promise<string> {
  return read(bytes).then(
    () => 'not refused',
    (error: unknown) => (isHalfmarkError(error) ? error.message : String(error)),
  );
}

function utf16(text: string, order: 'le' | 'be'): Uint8Array {
  const little = Buffer.from(`\ufeff${text}`, 'utf16le');
  return order === 'le' ? little : Buffer.from(little).swap16();
}

describe('an answer sheet', () => {
  it('is read in UTF-8 with or without a mark and in UTF-16 with one, wherever the pieces are cut', async () => {
    const expected = [
      { line: 2, student: 'ada@wrenfield.example', question: '1', part: 'a', answer: '[[1, i], [-i, 1]]' },
      { line: 3, student: 'ben@wrenfield.example', question: '2', part: 'b', answer: '½ħω' },
    ];
    for (const size of [1, 2, 3, 7, 1000]) {
      expect(await read(sheet, size)).toEqual(expected);
      expect(await read(`\ufeff${sheet}`, size)).toEqual(expected);
      expect(await read(utf16(sheet, 'le'), size)).toEqual(expected);
      expect(await read(utf16(sheet, 'be'), size)).toEqual(expected);
    }
  });

  it('may be divided by semicolons or tabs, with Windows line ends, other columns and another order', async () => {
    expect(await read('Part;Answer;Student;Question;Note\r\na;"[a; b]";x@y.example;1;none\r\n')).toEqual([
      { line: 2, student: 'x@y.example', question: '1', part: 'a', answer: '[a; b]' },
    ]);
    expect(await read('student\tquestion\tpart\tanswer\nx@y.example\t1\ta\ta, b\n')).toMatchObject([
      { answer: 'a, b' },
    ]);
  });

  it('keeps the line of the file, past blank lines and answers of several lines', async () => {
    const rows = await read('student,question,part,answer\nx,1,a,1\n\n\ny,1,a,"[[1, 0],\n[0, 1]]"\nz,1,a,2\n');
    expect(rows.map(({ line }) => line)).toEqual([2, 5, 7]);
  });

  it('is refused for a wrong header, naming what is missing', async () => {
    expect(await refusal('name,question,part\nx,1,a\n')).toContain('student and answer are missing');
    expect(await refusal('student,question,part,answer,answer\nx,1,a,1,2\n')).toContain('answer twice');
    expect(await refusal('student,question,part,answer\n')).toContain('no rows');
    expect(await refusal('')).toContain('no rows');
  });

  it('is refused for other bytes, naming the line', async () => {
    const latin1 = Buffer.from('student,question,part,answer\nx,1,a,1\nx,1,b,\xbdh\n', 'latin1');
    expect(await refusal(latin1)).toContain('Line 3');
    expect(await refusal('student,question,part,answer\nx,1,a,\0\n')).toContain('Line 2');
  });

  it('is refused for a quotation mark without its partner', async () => {
    expect(await refusal('student,question,part,answer\nx,1,a,"open\ny,1,a,2\n')).toContain('quotation mark');
  });
});

describe('cells that a spreadsheet would take for a formula', () => {
  it('are shown as text and read back as they were', () => {
    for (const text of ['=1+1', '+x', '-i hbar S_z', '@a', '\tx']) {
      expect(neutraliseFormula(text)).toBe(`'${text}`);
      expect(withoutNeutralising(neutraliseFormula(text))).toBe(text);
    }
    expect(neutraliseFormula('i hbar S_z')).toBe('i hbar S_z');
    expect(withoutNeutralising("'quoted'")).toBe("'quoted'");
  });
});
