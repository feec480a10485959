import type { ProblemSetState } from './problem-set-state';
import type { SetPolicy } from './set-policy';

/** What an instructor plans of a set; times are instants. */
export type SetPlan = {
  title: string;
  opensAt: Date | null;
  closesAt: Date | null;
  appealsUntil: Date | null;
  attemptsAllowed: number;
  policy: SetPolicy;
};

/** What is wrong with a plan, by the name of the field; empty when nothing is. */
export type PlanFaults = Partial<Record<keyof SetPlan | 'appealMayLower', string>>;

/**
 * Whether students may have seen a set: it has been opened and its opening time has come. Before that everything about
 * it may be changed, since nobody can be harmed.
 */
export function hasBegun(set: { state: ProblemSetState; opensAt: Date | null }, now: Date): boolean {
  return set.state !== 'draft' && (set.opensAt === null || set.opensAt <= now);
}

/** Faults of a plan by itself: the times are in order. */
export function faultsOfPlan(plan: SetPlan): PlanFaults {
  const faults: PlanFaults = {};
  if (plan.opensAt && plan.closesAt && plan.closesAt <= plan.opensAt) {
    faults.closesAt = 'The set closes after it opens: choose a later time.';
  }
  if (plan.closesAt && plan.appealsUntil && plan.appealsUntil < plan.closesAt) {
    faults.appealsUntil = 'Appeals end after the set closes: choose a later time.';
  }
  if (plan.appealsUntil && !plan.closesAt) {
    faults.closesAt = 'Give a closing time before the end of appeals.';
  }
  return faults;
}

/**
 * Faults of changing a set from one plan to another at `now`. A set that students have not seen takes any plan in order;
 * after that a change may give students more (time, attempts, appeals), never less, and what has happened stays.
 */
export function faultsOfChange(set: SetPlan & { state: ProblemSetState }, next: SetPlan, now: Date): PlanFaults {
  const faults = faultsOfPlan(next);
  if (!hasBegun(set, now)) {
    if (set.state === 'open' && !(next.opensAt && next.closesAt)) {
      faults[next.opensAt ? 'closesAt' : 'opensAt'] = 'A set that is to open by itself keeps both times.';
    } else if (set.state === 'open' && next.closesAt! <= now) {
      faults.closesAt = 'Choose a closing time that has not passed.';
    }
    return faults;
  }
  if (!sameTime(set.opensAt, next.opensAt)) faults.opensAt = 'The set has opened; its opening time stays.';
  if (set.state === 'open') {
    if (isEarlier(next.closesAt, set.closesAt)) {
      faults.closesAt = 'Students were told the present closing time. It can be made later, or the set closed now.';
    }
  } else if (!sameTime(set.closesAt, next.closesAt)) {
    faults.closesAt = 'The set has closed. Open it again to give everyone more time.';
  }
  if (isEarlier(next.appealsUntil, set.appealsUntil)) {
    faults.appealsUntil = 'Students were told the present end of appeals. It can be made later.';
  }
  if (next.attemptsAllowed < set.attemptsAllowed) {
    faults.attemptsAllowed = `Students were promised ${set.attemptsAllowed} attempts. The number can be raised.`;
  }
  if (next.policy.appealMayLower && !set.policy.appealMayLower) {
    faults.appealMayLower = 'Students were told that an appeal cannot lower a mark; that stays.';
  }
  return faults;
}

function sameTime(a: Date | null, b: Date | null): boolean {
  return (a?.getTime() ?? null) === (b?.getTime() ?? null);
}

/** Whether `next` is an earlier end than `before`; to leave an end out is to make it unknown, which counts as earlier. */
function isEarlier(next: Date | null, before: Date | null): boolean {
  if (before === null) return false;
  return next === null || next < before;
}
