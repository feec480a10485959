/** The states of a problem set, in order: draft, open, closed, released. */
export const problemSetStates = ['draft', 'open', 'closed', 'released'] as const;

export type ProblemSetState = (typeof problemSetStates)[number];

const next: Record<ProblemSetState, readonly ProblemSetState[]> = {
  draft: ['open'],
  open: ['closed'],
  closed: ['open', 'released'],
  released: [],
};

/** Whether a set may pass from one state to the other; a closed set may be opened again, a released one may not. */
export function mayPassTo(from: ProblemSetState, to: ProblemSetState): boolean {
  return next[from].includes(to);
}

/**
 * Whether a student may hand in at `now`: the set is open, its opening time has come and the student's own closing time
 * (the set's, or a later one by extension) has not passed. Times are instants; a time zone is only for showing them.
 */
export function acceptsAnswers(
  set: { state: ProblemSetState; opensAt: Date | null; closesAt: Date | null },
  extendedUntil: Date | null,
  now: Date,
): boolean {
  if (set.state === 'draft' || set.state === 'released') return false;
  if (set.opensAt && now < set.opensAt) return false;
  const until = closingTime(set.closesAt, extendedUntil);
  if (set.state === 'closed') return extendedUntil !== null && now < extendedUntil;
  return until === null || now < until;
}

/** The later of a set's closing time and a student's extension; null when the set has no closing time. */
export function closingTime(closesAt: Date | null, extendedUntil: Date | null): Date | null {
  if (closesAt === null) return null;
  return extendedUntil !== null && extendedUntil > closesAt ? extendedUntil : closesAt;
}
