/**
 * A failure that a person can mend: what went wrong, and what to do about it. Scripts print it as one line and leave
 * with a non-zero exit code; anything else that is thrown is a defect and keeps its stack.
 */
export class Failure extends Error {
  /**
   * @param {string} cause one sentence, without a trailing line break
   * @param {string} cure one sentence that says what to do
   */
  constructor(cause, cure) {
    super(`${oneLine(cause)} ${oneLine(cure)}`.trim());
    this.name = 'Failure';
  }
}

/** Turns an error of the operating system into a Failure where its cure is known; returns anything else unchanged. */
export function explain(error, folder = 'the project') {
  const text = `${error?.code ?? ''} ${error?.message ?? ''}`;
  if (/ENOSPC|No space left on device/i.test(text)) {
    return new Failure(
      `The disk that holds ${folder} is full.`,
      'Free some space (about 2 GB is enough) and start again.',
    );
  }
  if (/EROFS/.test(text)) {
    return new Failure(`${folder} is on a read-only disk.`, 'Clone the project to a folder you can write to.');
  }
  if (error?.code === 'EACCES' || error?.code === 'EPERM') {
    return new Failure(
      `${error.path ?? folder} may not be read or written by this user.`,
      'Start as the user who started first, or give this user the folder.',
    );
  }
  return error;
}

/** Prints an error for a person: a Failure as its one line, anything else with its stack. */
export function report(error, folder) {
  const known = explain(error, folder);
  if (known instanceof Failure) console.error(`halfmark: ${known.message}`);
  else console.error('halfmark: unexpected failure, please report it:', known);
}

/** The last lines of a program's output, on one line, short enough to be read. */
export function lastWords(output, length = 300) {
  const words = oneLine(String(output ?? '').trim());
  return words.length > length ? `…${words.slice(-length)}` : words;
}

function oneLine(text) {
  return String(text).replace(/\s+/g, ' ').trim();
}
