import { hasBegun } from '@/lib/domain/problem-set-change';
import { type ProblemSetState } from '@/lib/domain/problem-set-state';

/** A set's state in words, and the moment that matters next, if there is one: "Open" until then. */
export type SetStateInWords = { word: string; joins: string; at: Date | null };

/** Says where a set stands: a set opened ahead of its time still "opens", and one past its closing time "closes now". */
export function presentSetState(
  set: { state: ProblemSetState; opensAt: Date | null; closesAt: Date | null },
  now: Date,
): SetStateInWords {
  switch (set.state) {
    case 'draft':
      return { word: 'Draft', joins: 'planned for', at: set.opensAt };
    case 'open':
      return hasBegun(set, now)
        ? { word: 'Open', joins: 'until', at: set.closesAt }
        : { word: 'Coming', joins: 'opens', at: set.opensAt };
    case 'closed':
      return { word: 'Closed', joins: 'since', at: set.closesAt };
    case 'released':
      return { word: 'Released', joins: 'closed', at: set.closesAt };
  }
}
