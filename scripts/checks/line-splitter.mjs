import { TextDecoder } from 'node:util';

/** A line longer than this many bytes is an error, and is not kept. */
export const LINE_LIMIT = 1_000_000;

const NEWLINE = 0x0a;

/**
 * Splits a stream of bytes into numbered lines. A byte order mark and carriage returns are dropped, blank lines are
 * skipped but counted. `text` is null for a line over the limit, whose bytes are let go as they come.
 */
export class LineSplitter {
  #decoder = new TextDecoder('utf-8', { ignoreBOM: true });
  #parts = [];
  #length = 0;
  #tooLong = false;
  #number = 0;

  /** The lines that a chunk completes. */
  push(chunk) {
    const lines = [];
    let start = 0;
    for (let end = chunk.indexOf(NEWLINE); end >= 0; end = chunk.indexOf(NEWLINE, start)) {
      this.#keep(chunk.subarray(start, end));
      this.#finish(lines);
      start = end + 1;
    }
    this.#keep(chunk.subarray(start));
    return lines;
  }

  /** The last line, where the input does not end with a newline. */
  end() {
    const lines = [];
    if (this.#length > 0) this.#finish(lines);
    return lines;
  }

  #keep(bytes) {
    this.#length += bytes.length;
    if (this.#length > LINE_LIMIT) {
      this.#tooLong = true;
      this.#parts = [];
    } else if (bytes.length > 0) this.#parts.push(bytes);
  }

  #finish(lines) {
    this.#number += 1;
    const number = this.#number;
    if (this.#tooLong) lines.push({ number, text: null });
    else {
      let text = this.#decoder.decode(Buffer.concat(this.#parts));
      if (number === 1 && text.charCodeAt(0) === 0xfeff) text = text.slice(1);
      if (text.endsWith('\r')) text = text.slice(0, -1);
      if (text.trim() !== '') lines.push({ number, text });
    }
    this.#parts = [];
    this.#length = 0;
    this.#tooLong = false;
  }
}
