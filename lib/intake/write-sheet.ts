import { stringify } from 'csv-stringify';
import { pipeline, Readable } from 'node:stream';
import { neutraliseFormula } from './neutralise-formula';

/** Spreadsheets take a file for UTF-8 when it begins so. */
const BYTE_ORDER_MARK = '\uFEFF';

/**
 * Writes rows as CSV (RFC 4180, UTF-8) as they are read, so that memory does not grow with the sheet. No cell can be taken
 * for a formula.
 */
export function writeSheet(
  columns: readonly string[],
  rows: AsyncIterable<readonly (string | number | null)[]> | Iterable<readonly (string | number | null)[]>,
): ReadableStream<Uint8Array> {
  const source = async function* () {
    yield [...columns];
    for await (const row of rows) yield row.map((cell) => (typeof cell === 'string' ? neutraliseFormula(cell) : cell));
  };
  const writer = stringify({ record_delimiter: '\r\n', bom: false });
  // A fault of the source ends the stream with it; whoever reads it is told.
  pipeline(Readable.from(source()), writer, () => undefined);
  const marked = async function* () {
    yield Buffer.from(BYTE_ORDER_MARK, 'utf8');
    for await (const chunk of writer) yield Buffer.from(chunk as Buffer);
  };
  return Readable.toWeb(Readable.from(marked())) as ReadableStream<Uint8Array>;
}

/** A CSV sheet as a download: an attachment under a plain name, which no browser opens as anything else. */
export function sheetResponse(body: ReadableStream<Uint8Array>, fileName: string): Response {
  return new Response(body, {
    headers: {
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': `attachment; filename="${fileName.replace(/[^A-Za-z0-9._-]/g, '-')}"`,
      'x-content-type-options': 'nosniff',
      'cache-control': 'no-store',
    },
  });
}
