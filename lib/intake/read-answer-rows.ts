import { pipeline, Readable } from 'node:stream';
import { CsvError, parse } from 'csv-parse';
import { HalfmarkError } from '@/lib/errors';
import { decodeText } from './decode-text';

/** One row of an answer sheet, fields trimmed of nothing: an answer is kept as it was written. */
export type AnswerRow = {
  /** Line of the file on which the row begins, counted from 1. */
  line: number;
  student: string;
  question: string;
  part: string;
  answer: string;
};

/** The columns of an answer sheet, one row an answer; others are passed over. */
export const answerColumns = ['student', 'question', 'part', 'answer'] as const;

/** Rows beyond this are refused as a whole: a course's answers are some ten thousand. */
export const MAX_ROWS = 100_000;
const MAX_RECORD_CHARACTERS = 100_000;

/**
 * Reads an answer sheet in CSV (RFC 4180; comma, semicolon or tab, as the header has it) as it streams in. Throws
 * `invalid` with the line and what to do for a wrong header, unbalanced quotes, rows that are too long or too many.
 */
export async function* readAnswerRows(file: AsyncIterable<Uint8Array>): AsyncGenerator<AnswerRow> {
  const { delimiter, text } = await withDelimiter(decodeText(file));
  const parser = parse({
    columns: (header: string[]) => columnsOf(header),
    delimiter,
    info: true,
    max_record_size: MAX_RECORD_CHARACTERS,
    raw: true,
    relax_column_count: true,
    skip_empty_lines: true,
  });
  // A fault of the source ends the parser with it, and is thrown by the loop below.
  pipeline(Readable.from(text), parser, () => undefined);
  let rows = 0;
  try {
    for await (const { record, info, raw } of parser as AsyncIterable<CsvRecord>) {
      rows += 1;
      if (rows > MAX_ROWS) {
        throw new HalfmarkError('invalid', `The sheet has more than ${MAX_ROWS} rows. Split it into several files.`);
      }
      yield {
        // The parser counts the line on which a row ends; a quoted answer may hold line ends of its own.
        line: info.lines - lineEndsIn(raw),
        student: record.student ?? '',
        question: record.question ?? '',
        part: record.part ?? '',
        answer: record.answer ?? '',
      };
    }
  } catch (error) {
    throw inWords(error);
  }
  if (rows === 0) throw new HalfmarkError('invalid', 'The sheet has no rows below its header.');
}

type CsvRecord = { record: Partial<Record<string, string>>; info: { lines: number }; raw: string };

function lineEndsIn(raw: string): number {
  return raw.trim().split(/\r\n|\r|\n/).length - 1;
}

/** A header of more characters than this is none. */
const MAX_HEADER_CHARACTERS = 10_000;

/** Spreadsheets write a comma, a semicolon or a tab; the header, which has no other use for them, tells which. */
async function withDelimiter(
  text: AsyncGenerator<string>,
): Promise<{ delimiter: string; text: AsyncGenerator<string> }> {
  let head = '';
  while (!/[\r\n]/.test(head) && head.length < MAX_HEADER_CHARACTERS) {
    const next = await text.next();
    if (next.done) break;
    head += next.value;
  }
  const header = head.split(/[\r\n]/, 1)[0] ?? '';
  const counts = [',', ';', '\t'].map((delimiter) => ({ delimiter, count: header.split(delimiter).length }));
  const best = counts.reduce((most, candidate) => (candidate.count > most.count ? candidate : most));
  return { delimiter: best.delimiter, text: chain(head, text) };
}

async function* chain(head: string, rest: AsyncGenerator<string>): AsyncGenerator<string> {
  yield head;
  yield* rest;
}

/** The names of the columns in lower case; the four that are needed must be there, once each. */
function columnsOf(header: readonly string[]): string[] {
  const names = header.map((name) => name.trim().toLowerCase());
  const missing = answerColumns.filter((column) => !names.includes(column));
  if (missing.length > 0) {
    throw new HalfmarkError(
      'invalid',
      `The first line must name the columns ${answerColumns.join(', ')}; ${missing.join(' and ')} ${missing.length === 1 ? 'is' : 'are'} missing. Download the empty sheet to see the form.`,
    );
  }
  const twice = answerColumns.find((column) => names.filter((name) => name === column).length > 1);
  if (twice) throw new HalfmarkError('invalid', `The first line names the column ${twice} twice.`);
  return names.map((name, index) => name || `column ${index + 1}`);
}

function inWords(error: unknown): unknown {
  if (!(error instanceof CsvError)) return error;
  const line = typeof error.lines === 'number' ? error.lines : null;
  const where = line === null ? 'The sheet' : `Near line ${line} the sheet`;
  switch (error.code) {
    case 'CSV_QUOTE_NOT_CLOSED':
    case 'CSV_INVALID_CLOSING_QUOTE':
    case 'INVALID_OPENING_QUOTE':
      return new HalfmarkError(
        'invalid',
        `${where} has a quotation mark without its partner. Mend it and upload again.`,
      );
    case 'CSV_MAX_RECORD_SIZE':
      return new HalfmarkError('invalid', `${where} has a row of more than ${MAX_RECORD_CHARACTERS} characters.`);
    default:
      return new HalfmarkError(
        'invalid',
        `${where} cannot be read as CSV. Save it as CSV in UTF-8 and upload it again.`,
        {
          log: error.code,
        },
      );
  }
}
