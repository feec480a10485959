import { describe, expect, it } from 'vitest';
import { type Condition } from '@/lib/checker/notation/answer-tree';
import { parseCondition } from '@/lib/checker/notation/parse';
import { structureOf } from '@/lib/checker/notation/structure';

const symbols = { a: 'real', b: 'real', n: 'integer', d: 'real', o: 'real', r: 'real', t: 'real' } as const;

function show(condition: Condition): string {
  switch (condition.node) {
    case 'comparison':
      return condition.operands
        .map(
          (operand, index) =>
            structureOf(operand) + (condition.relations[index] ? ` ${condition.relations[index]} ` : ''),
        )
        .join('');
    case 'not':
      return `not(${show(condition.body)})`;
    case 'and':
    case 'or':
      return `${condition.node}(${condition.parts.map(show).join('; ')})`;
  }
}

describe('conditions', () => {
  it.each([
    ['a = b', "'a = 'b"],
    ['a == b', "'a = 'b"],
    ['a != 0', "'a != 0"],
    ['a ≠ 0', "'a != 0"],
    ['a \\neq 0', "'a != 0"],
    ['a < b', "'a < 'b"],
    ['a <= b', "'a <= 'b"],
    ['a ≤ b', "'a <= 'b"],
    ['a >= b + 1', "'a >= (sum + 'b + 1)"],
    ['a > -1', "'a > (sum - 1)"],
    ['0 < a < b', "0 < 'a < 'b"],
    ['a < b and b < 1', "and('a < 'b; 'b < 1)"],
    ['a < b or b < 1 and n = 2', "or('a < 'b; and('b < 1; 'n = 2))"],
    ['(a < b or b < 1) and n = 2', "and(or('a < 'b; 'b < 1); 'n = 2)"],
    ['not a = b', "not('a = 'b)"],
    ['not (a = b or a = 1)', "not(or('a = 'b; 'a = 1))"],
    ['(a + b) < 1', "(sum + 'a + 'b) < 1"],
    ['(a + b)*2 < (a)', "(* (sum + 'a + 'b) 2) < 'a"],
    ['abs(a) != abs(b)', "(absolute 'a) != (absolute 'b)"],
    ['|a| < |b|', "(absolute 'a) < (absolute 'b)"],
    ['probability(ket(+), S_x*ket(-)) > 0', 'probability(|+z>, (* spin_x |-z>)) > 0'],
    ['expectation(S_z, ket(+x)) = 0', 'expectation(spin_z, |+x>) = 0'],
    ['a*n != b', "(* 'a 'n) != 'b"],
  ])('%s', (text, expected) => {
    const { tree, diagnostics } = parseCondition(text, { symbols, allowReferenceFunctions: true });
    expect(diagnostics).toEqual([]);
    expect(tree && show(tree)).toBe(expected);
  });

  it.each([
    ['a', 'comparison'],
    ['a <', 'missing-operand'],
    ['< a', 'missing-operand'],
    ['S_x = 1', 'comparison'],
    ['ket(+) = 1', 'comparison'],
    ['a < b and', 'missing-operand'],
    ['a < b b < 1 or', 'missing-operand'],
    ['(a < b', 'unclosed'],
    ['a < b)', 'unexpected'],
    ['not', 'missing-operand'],
    ['a = q', 'undeclared-name'],
    ['', 'empty'],
    ['a & b', 'comparison'],
    [`${'('.repeat(200)}a<b${')'.repeat(200)}`, 'too-deep'],
  ])('%s is no condition', (text, code) => {
    const { tree, diagnostics } = parseCondition(text, { symbols });
    expect(tree).toBeNull();
    expect(diagnostics.map((diagnostic) => diagnostic.code)).toEqual([code]);
  });
});
