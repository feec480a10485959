/** The four verdicts of the checker. */
export const verdicts = ['agrees', 'differs', 'undecided', 'unreadable'] as const;

export type Verdict = (typeof verdicts)[number];

/** The sign and the word of each verdict: the sign never stands alone. */
export const verdictSigns: Record<Verdict, { sign: string; word: string }> = {
  agrees: { sign: '≡', word: 'Agrees' },
  differs: { sign: '≢', word: 'Differs' },
  undecided: { sign: '≟', word: 'Undecided' },
  unreadable: { sign: '∅', word: 'Unreadable' },
};
