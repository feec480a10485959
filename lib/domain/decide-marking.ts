import { type Thousandths } from './credit';
import type { FlagReason } from './flag-reasons';
import type { SetPolicy } from './set-policy';
import type { Verdict } from './verdict';

/** What an author or a set's rule gives for one slip: a credit, or a person decides. */
export type SlipCredit = { slip: string; credit: Thousandths | 'person' };

/** What the checker found of one answer, as far as marking goes. */
export type CheckOutcome = {
  verdict: Verdict;
  /** Every slip that fits, the naming one first. */
  slips: readonly string[];
  /** Whether something was left to be worked out (the question written back). */
  notEvaluated: boolean;
  /** Whether the answer agrees only with a reference recomputed from the student's own earlier answer. */
  followsThrough: boolean;
};

/**
 * What becomes of a checked answer: an automatic credit, or a person with the reasons and, where the machine has one, a
 * suggestion. `rule` is the slip whose credit was used.
 */
export type MarkingDecision =
  | { kind: 'automatic'; credit: Thousandths; rule: string | null }
  | { kind: 'person'; reasons: FlagReason[]; suggestion: Thousandths | null; rule: string | null };

/**
 * Decides whether a checked answer is credited by itself or goes to a person, by a set's policy.
 *
 * The verdict `agrees` earns the part's full credit; `differs` earns the credit of the first of its slips that has one;
 * a set's own rules come before the author's. Where several slips fit with different credits a person decides, since
 * the machine cannot tell which one the student made.
 */
export function decideMarking(
  check: CheckOutcome,
  part: { outOf: Thousandths; slipCredits: readonly SlipCredit[]; alwaysPerson?: boolean },
  policy: SetPolicy,
  attached: { scan: boolean } = { scan: false },
): MarkingDecision {
  const reasons: FlagReason[] = [];
  const suggested = suggestCredit(check, part, reasons);
  if (check.notEvaluated && check.verdict !== 'unreadable') reasons.push('not-evaluated');
  if (check.followsThrough) reasons.push('follow-through');
  if (attached.scan) reasons.push('scan');
  const flagged = reasons.filter((reason) => policy.flag.includes(reason) || mustSeePerson(reason));
  if (flagged.length === 0 && suggested.credit !== null && part.alwaysPerson !== true) {
    return { kind: 'automatic', credit: suggested.credit, rule: suggested.rule };
  }
  if (flagged.length === 0 && part.alwaysPerson !== true) {
    return { kind: 'automatic', credit: 0, rule: null };
  }
  return {
    kind: 'person',
    reasons: flagged.length > 0 ? flagged : ['slip-left-to-person'],
    suggestion: check.notEvaluated ? null : suggested.credit,
    rule: suggested.rule,
  };
}

/** Reasons that no policy can switch off: the machine has no credit to give, or may never give one by itself. */
function mustSeePerson(reason: FlagReason): boolean {
  return (
    reason === 'undecided' || reason === 'unreadable' || reason === 'not-evaluated' || reason === 'slip-left-to-person'
  );
}

function suggestCredit(
  check: CheckOutcome,
  part: { outOf: Thousandths; slipCredits: readonly SlipCredit[] },
  reasons: FlagReason[],
): { credit: Thousandths | null; rule: string | null } {
  switch (check.verdict) {
    case 'agrees':
      return { credit: part.outOf, rule: null };
    case 'undecided':
      reasons.push('undecided');
      return { credit: null, rule: null };
    case 'unreadable':
      reasons.push('unreadable');
      return { credit: null, rule: null };
    case 'differs':
      return creditOfSlips(check.slips, part.slipCredits, reasons);
  }
}

function creditOfSlips(
  slips: readonly string[],
  slipCredits: readonly SlipCredit[],
  reasons: FlagReason[],
): { credit: Thousandths | null; rule: string | null } {
  const fitting = slips.flatMap((slip) => slipCredits.find((given) => given.slip === slip) ?? []);
  const first = fitting[0];
  if (first === undefined) {
    reasons.push('no-credited-slip');
    return { credit: null, rule: null };
  }
  if (first.credit === 'person' || fitting.some((given) => given.credit !== first.credit)) {
    reasons.push('slip-left-to-person');
    return { credit: null, rule: first.slip };
  }
  return { credit: first.credit, rule: first.slip };
}
