/**
 * Every way in which Halfmark refuses or fails on purpose: a closed table of codes with their HTTP status and the
 * sentence a person reads when the code alone is known. Code elsewhere compares codes, never message text.
 */
export const errorTable = {
  'signed-out': { status: 401, message: 'Please sign in first.' },
  forbidden: { status: 403, message: 'You may not do this in this course.' },
  'cross-origin': { status: 403, message: 'This request came from another site and was refused.' },
  'not-found': { status: 404, message: 'There is nothing here, or it is not yours to see.' },
  invalid: { status: 422, message: 'Something in the form needs mending.' },
  conflict: { status: 409, message: 'Someone changed this meanwhile. Reload the page and look again.' },
  'wrong-state': { status: 409, message: 'This cannot be done in the present state.' },
  'lease-lost': {
    status: 409,
    message: 'Your hold on this answer ran out and another grader may have it. Take the next one.',
  },
  'too-large': { status: 413, message: 'This is larger than Halfmark accepts.' },
  'unsupported-type': { status: 415, message: 'This kind of file cannot be read here.' },
  'too-many': { status: 429, message: 'Too many tries. Please wait a little.' },
  unexpected: { status: 500, message: 'Something went wrong on our side. Nothing was lost; please try again.' },
  unavailable: { status: 503, message: 'Halfmark is not ready yet. Please try again in a moment.' },
} as const satisfies Record<string, { status: number; message: string }>;

export type ErrorCode = keyof typeof errorTable;

/**
 * A refusal or failure with a code from the table. `message` is for the person and says what to do; `log` is for the
 * log and never holds an answer, a password or a token.
 */
export class HalfmarkError extends Error {
  readonly code: ErrorCode;
  readonly log: string;
  /** For `invalid`: what is wrong, by the name of the field. */
  readonly fields: Readonly<Record<string, string>>;

  constructor(
    code: ErrorCode,
    message: string = errorTable[code].message,
    extra: { log?: string; fields?: Record<string, string>; cause?: unknown } = {},
  ) {
    super(message, { cause: extra.cause });
    this.name = 'HalfmarkError';
    this.code = code;
    this.log = extra.log ?? message;
    this.fields = extra.fields ?? {};
  }

  /** The HTTP status that goes with the code. */
  get status(): number {
    return errorTable[this.code].status;
  }
}

/** Whether a value is one of our own refusals, with that code if one is given. */
export function isHalfmarkError(error: unknown, code?: ErrorCode): error is HalfmarkError {
  return error instanceof HalfmarkError && (code === undefined || error.code === code);
}
