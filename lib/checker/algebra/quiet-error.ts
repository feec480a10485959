/** V8's limit on recorded stack frames, where there is one. */
const recording = Error as unknown as { stackTraceLimit?: number };

/** An error that is part of the normal course of a check: it carries no stack, whose recording costs more than the check. */
export class QuietError extends Error {
  constructor(message = '') {
    const limit = recording.stackTraceLimit;
    recording.stackTraceLimit = 0;
    super(message);
    recording.stackTraceLimit = limit;
  }
}
