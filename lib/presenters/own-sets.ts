import { acceptsAnswers, closingTime } from '@/lib/domain/problem-set-state';
import { type OwnSetRow } from '@/lib/queries/own-sets';

/** Where a set stands for one student: it takes answers, is being marked, or its scores are out. */
export type WorkState = 'open' | 'being-marked' | 'released';

/** A set in the list of a student's work. */
export type OwnSetLine = {
  setId: string;
  name: string;
  course: { id: string; code: string; title: string; timeZone: string };
  state: WorkState;
  /** The student's own closing time as an ISO text; null for a set without one. */
  closesAt: string | null;
  isExtended: boolean;
  parts: number;
  partsHandedIn: number;
};

/** The list of a student's work: what is open first, the next to close on top; then the rest, the latest first. */
export function presentOwnSets(rows: readonly OwnSetRow[], now: Date): Record<WorkState, OwnSetLine[]> {
  const lines = rows.map((row) => presentLine(row, now));
  const inState = (state: WorkState) => lines.filter((line) => line.state === state);
  const open = inState('open').sort((a, b) => (a.closesAt ?? '9').localeCompare(b.closesAt ?? '9'));
  return { open, 'being-marked': inState('being-marked'), released: inState('released') };
}

function presentLine(row: OwnSetRow, now: Date): OwnSetLine {
  const closesAt = closingTime(row.closesAt, row.extendedUntil);
  return {
    setId: row.setId,
    name: `Set ${row.number}, ${row.title}`,
    course: { id: row.courseId, code: row.courseCode, title: row.courseTitle, timeZone: row.timeZone },
    state: stateOf(row, now),
    closesAt: closesAt?.toISOString() ?? null,
    isExtended: closesAt !== null && row.closesAt !== null && closesAt > row.closesAt,
    parts: row.parts,
    partsHandedIn: row.partsHandedIn,
  };
}

function stateOf(row: OwnSetRow, now: Date): WorkState {
  if (row.releasedAt !== null) return 'released';
  return acceptsAnswers(row, row.extendedUntil, now) ? 'open' : 'being-marked';
}
