import { HalfmarkError } from '@/lib/errors';

export type TextEncoding = 'utf-8' | 'utf-16le' | 'utf-16be';

/** How a text file says it is written: by its byte-order mark; without one it is UTF-8. */
export function encodingOf(head: Uint8Array): TextEncoding {
  if (head[0] === 0xff && head[1] === 0xfe) return 'utf-16le';
  if (head[0] === 0xfe && head[1] === 0xff) return 'utf-16be';
  return 'utf-8';
}

/**
 * Decodes a text file as it streams in: UTF-8 with or without a byte-order mark, UTF-16 with one. Bytes that are not
 * that encoding are refused, naming the line; so is a NUL, which no text has.
 */
export async function* decodeText(chunks: AsyncIterable<Uint8Array>): AsyncGenerator<string, TextEncoding> {
  let decoder: TextDecoder | null = null;
  let encoding: TextEncoding = 'utf-8';
  let head: Uint8Array = new Uint8Array();
  let line = 1;
  const decode = (bytes: Uint8Array, end: boolean): string => {
    decoder ??= new TextDecoder(encoding, { fatal: true });
    try {
      const text = decoder.decode(bytes, { stream: !end });
      const nul = text.indexOf('\0');
      if (nul >= 0) throw notText(line + count(text.slice(0, nul)), encoding);
      line += count(text);
      return text;
    } catch (error) {
      if (error instanceof HalfmarkError) throw error;
      throw notText(line + linesBeforeFault(bytes, encoding), encoding);
    }
  };
  for await (const chunk of chunks) {
    let bytes: Uint8Array = chunk;
    if (!decoder) {
      head = concatenate(head, chunk);
      if (head.length < 4) continue;
      encoding = encodingOf(head);
      bytes = head;
    }
    yield decode(bytes, false);
  }
  if (!decoder) {
    encoding = encodingOf(head);
    yield decode(head, true);
  } else {
    yield decode(new Uint8Array(), true);
  }
  return encoding;
}

function count(text: string): number {
  let lines = 0;
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) lines += 1;
  return lines;
}

/** Line ends in front of the first byte that cannot be decoded: the longest beginning that can be is searched for. */
function linesBeforeFault(bytes: Uint8Array, encoding: TextEncoding): number {
  let good = 0;
  let bad = bytes.length;
  while (bad - good > 1) {
    const middle = (good + bad) >> 1;
    try {
      new TextDecoder(encoding, { fatal: true }).decode(bytes.subarray(0, middle), { stream: true });
      good = middle;
    } catch {
      bad = middle;
    }
  }
  return count(new TextDecoder(encoding).decode(bytes.subarray(0, good), { stream: true }));
}

function concatenate(first: Uint8Array, second: Uint8Array): Uint8Array {
  const both = new Uint8Array(first.length + second.length);
  both.set(first);
  both.set(second, first.length);
  return both;
}

function notText(line: number, encoding: TextEncoding): HalfmarkError {
  return new HalfmarkError(
    'invalid',
    `Line ${line} holds bytes that are not ${encoding === 'utf-8' ? 'UTF-8' : 'UTF-16'} text. Save the sheet as CSV in UTF-8 and upload it again.`,
  );
}
