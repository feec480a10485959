import { check, compute } from '@/lib/checker';
import { type Condition, type Relation } from '@/lib/checker/notation/answer-tree';
import { type Expression } from '@/lib/checker/notation/tree';
import { type DrawnValues, type TemplateContent } from './content';
import { evaluateConstant } from './evaluate-constant';
import { printExpression } from './print-expression';
import { isExpression, readCondition, readText, readyValues, type ReadResult } from './read-text';

/** Whether a condition holds, or why that cannot be told. */
export type ConditionResult =
  { readonly ok: true; readonly value: boolean } | { readonly ok: false; readonly error: string };

/**
 * Whether a condition between drawn values holds: `= != < <= > >= and or not` between scalars. Two sides that are close
 * to each other are compared exactly, by the checker; only what is clearly apart is ordered by its decimal value.
 */
export function conditionHolds(
  text: string,
  values: DrawnValues,
  symbols: TemplateContent['symbols'] = [],
): ConditionResult {
  const ready = readyValues(values, symbols);
  if (!ready.ok) return ready;
  const read = readCondition(text, ready.tree);
  return read.ok ? holds(read.tree) : read;
}

function holds(condition: Condition): ConditionResult {
  switch (condition.node) {
    case 'not': {
      const inner = holds(condition.body);
      return inner.ok ? { ok: true, value: !inner.value } : inner;
    }
    case 'and':
    case 'or': {
      const decisive = condition.node === 'or';
      for (const part of condition.parts) {
        const result = holds(part);
        if (!result.ok || result.value === decisive) return result;
      }
      return { ok: true, value: !decisive };
    }
    case 'comparison': {
      for (const [index, relation] of condition.relations.entries()) {
        const result = compare(condition.operands[index]!, relation, condition.operands[index + 1]!);
        if (!result.ok || !result.value) return result;
      }
      return { ok: true, value: true };
    }
  }
}

/** Two values nearer than this share of their size are compared exactly. */
const NEAR = 1e-9;

function compare(left: Expression, relation: Relation, right: Expression): ConditionResult {
  const a = valueOf(left);
  if (!a.ok) return a;
  const b = valueOf(right);
  if (!b.ok) return b;
  const distance = Math.hypot(a.tree.re - b.tree.re, a.tree.im - b.tree.im);
  const size = Math.max(1e-300, Math.hypot(a.tree.re, a.tree.im), Math.hypot(b.tree.re, b.tree.im));
  const near = distance <= NEAR * size || distance < NEAR;
  const equal: ConditionResult = near ? areEqual(left, right) : { ok: true, value: false };
  if (!equal.ok) return equal;
  if (relation === '=' || relation === '!=') return { ok: true, value: equal.value === (relation === '=') };
  if (equal.value) return { ok: true, value: relation === '<=' || relation === '>=' };
  if (Math.abs(a.tree.im) > NEAR * size || Math.abs(b.tree.im) > NEAR * size) {
    return { ok: false, error: 'only real numbers can be ordered.' };
  }
  return { ok: true, value: relation.startsWith('<') === a.tree.re < b.tree.re };
}

function areEqual(left: Expression, right: Expression): ConditionResult {
  const [reference, answer] = [printExpression(left), printExpression(right)];
  if (reference === answer) return { ok: true, value: true };
  const outcome = check({ id: 'condition', kind: 'scalar', reference: `${reference} - (${answer})`, answer: '0' });
  if ('error' in outcome) return { ok: false, error: outcome.error };
  if (outcome.verdict === 'agrees' || outcome.verdict === 'differs') {
    return { ok: true, value: outcome.verdict === 'agrees' };
  }
  return { ok: false, error: 'the checker could not tell whether both sides are equal.' };
}

/** The decimal value of one side; a reference function in it is worked out first. */
function valueOf(tree: Expression): ReadResult<{ re: number; im: number }> {
  const direct = evaluateConstant(tree);
  if (direct !== null) return { ok: true, tree: direct };
  const computed = compute({ kind: 'scalar', reference: printExpression(tree) });
  if (!computed.ok) return { ok: false, error: computed.error };
  const read = readText(computed.text, 'scalar', {});
  const value = read.ok && isExpression(read.tree) ? evaluateConstant(read.tree) : null;
  return value === null
    ? { ok: false, error: `“${printExpression(tree)}” is not a number.` }
    : { ok: true, tree: value };
}
