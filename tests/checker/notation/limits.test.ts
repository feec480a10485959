import { describe, expect, it } from 'vitest';
import { maximumDepth, maximumLength, maximumMarks } from '@/lib/checker/notation/limits';
import { parse } from '@/lib/checker/notation/parse';
import { printLatex } from '@/lib/checker/notation/print-latex';
import { printPlain } from '@/lib/checker/notation/print-plain';
import { structureOf } from '@/lib/checker/notation/structure';
import { type AnswerKind } from '@/lib/checker/notation/answer-tree';
import { depthOf } from './walk';

const symbols = { x: 'real', a: 'real' } as const;

function codesOf(text: string, kind: AnswerKind = 'scalar'): readonly string[] {
  return parse(text, { kind, symbols }).diagnostics.map(({ code }) => code);
}

describe('limits', () => {
  it('reads the longest text and no longer one, counted in code points', () => {
    expect(codesOf(`x${' '.repeat(maximumLength - 1)}`)).toEqual([]);
    expect(codesOf(`x${' '.repeat(maximumLength)}`)).toEqual(['too-long']);
    expect(codesOf('𝑥 '.repeat(maximumLength / 2))).toEqual([]);
    expect(codesOf('x'.repeat(100_000))).toEqual(['too-long']);
  });

  it.each([
    ['round brackets', '(', 'x', ')'],
    ['square brackets', '[', 'x', ']'],
    ['exponents', 'x^{', 'x', '}'],
    ['bare exponents', 'x^', 'x', ''],
    ['roots', '√', 'x', ''],
    ['functions', 'sin ', 'x', ''],
    ['function brackets', 'sin(', 'x', ')'],
    ['signs', '- ', 'x', ''],
    ['fractions', '\\frac{1}{', 'x', '}'],
    ['lines over', '\\overline{', 'x', '}'],
  ])('reads %s to a depth and no deeper', (_, open, middle, close) => {
    const nested = (depth: number): string => open.repeat(depth) + middle + close.repeat(depth);
    expect(codesOf(nested(maximumDepth - 1))).toEqual([]);
    expect(codesOf(nested(maximumDepth + 1))).toEqual(['too-deep']);
    expect(codesOf(nested(1000).slice(0, maximumLength))).toHaveLength(1);
  });

  it('bounds the marks after an operand, and so the depth of the tree', () => {
    expect(codesOf(`x${'†'.repeat(maximumMarks)}`)).toEqual([]);
    expect(codesOf(`x${'†'.repeat(maximumMarks + 1)}`)).toEqual(['too-deep']);
    expect(codesOf(`S_x${'†'.repeat(maximumMarks + 1)}`, 'operator')).toEqual(['too-deep']);
    const marked = '('.repeat(99) + 'S_x' + `)${'†'.repeat(maximumMarks)}`.repeat(99);
    const { tree } = parse(marked, { kind: 'operator', symbols });
    expect(tree && depthOf(tree)).toBe(99 * (maximumMarks + 1) + 1);
    expect(tree && printLatex(tree).length).toBeGreaterThan(0);
    expect(tree && printPlain(tree).length).toBeGreaterThan(0);
  });

  it('bounds the number of nodes', () => {
    expect(codesOf('x²'.repeat(1000))).toEqual([]);
    expect(codesOf('x²'.repeat(2000))).toEqual(['too-many-nodes']);
  });

  it.each([
    ['a long sum', 'x+'.repeat(1999) + 'x'],
    ['a long product', 'x '.repeat(1999) + 'x'],
    ['a long quotient', 'x/'.repeat(1999) + 'x'],
    ['a long chain of quotients and products', 'x/a*'.repeat(999) + 'x'],
    ['deep brackets', '('.repeat(99) + 'x' + ')'.repeat(99)],
  ])('prints and compares %s', (_, text) => {
    const { tree } = parse(text, { kind: 'scalar', symbols });
    if (tree === null) throw new Error('unreadable');
    expect(depthOf(tree)).toBeLessThan(5 * maximumDepth);
    expect(printPlain(tree).length).toBeGreaterThan(0);
    expect(structureOf(tree).length).toBeGreaterThan(0);
    expect(printLatex(tree).length).toBeGreaterThan(0);
  });

  it('takes time in proportion to the length', () => {
    const timeOf = (text: string): number => {
      let best = Infinity;
      for (let round = 0; round < 12; round += 1) {
        const start = performance.now();
        parse(text, { kind: 'scalar', symbols });
        best = Math.min(best, performance.now() - start);
      }
      return best;
    };
    for (const unit of ['x+', 'sin x ', '|x|+', '\\left(x\\right)+', 'x^2/2a ', 'e^ix ', '(x', '\\left', 'xa', '<+|']) {
      const short = timeOf(unit.repeat(Math.floor(500 / unit.length)));
      const long = timeOf(unit.repeat(Math.floor(4000 / unit.length)));
      // Eight times the length; quadratic would be sixty-four. The constant absorbs the clock and the collector.
      expect(long).toBeLessThan(24 * short + 3);
    }
  });
});
