/** Why a row of an intake is refused. */
export const rowRefusals = [
  'no-student',
  'unknown-student',
  'other-section',
  'unknown-question',
  'unknown-part',
  'empty-answer',
  'too-long',
  'repeated',
] as const;

export type RowRefusal = (typeof rowRefusals)[number];

/** The longest answer that is kept; what is longer than the answer language allows is unreadable, but kept. */
export const MAX_STORED_ANSWER = 20_000;
