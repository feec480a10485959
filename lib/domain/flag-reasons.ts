/** Why an answer is flagged for a person, in the order in which a grader reads them. */
export const flagReasons = [
  'undecided',
  'unreadable',
  'no-credited-slip',
  'slip-left-to-person',
  'not-evaluated',
  'follow-through',
  'scan',
  'appeal',
  'second-marking',
  'spot-check',
] as const;

export type FlagReason = (typeof flagReasons)[number];

const sentences: Record<FlagReason, string> = {
  undecided: 'The checker could not decide.',
  unreadable: 'The checker could not read the answer.',
  'no-credited-slip': 'The answer differs, and no slip that has credit explains it.',
  'slip-left-to-person': 'The author left the credit of this slip to a person.',
  'not-evaluated': 'The question was written back: something is left to be worked out.',
  'follow-through': 'The answer follows from the student’s own earlier part.',
  scan: 'A scan is attached.',
  appeal: 'The student asked for another look.',
  'second-marking': 'Drawn for second marking.',
  'spot-check': 'Drawn for a spot check of the checker.',
};

/** The reason as one sentence for a grader. */
export function flagSentence(reason: FlagReason): string {
  return sentences[reason];
}
