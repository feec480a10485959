import { describe, expect, it } from 'vitest';
import { type AnswerKind } from '@/lib/checker/notation/answer-tree';
import { parse } from '@/lib/checker/notation/parse';
import { structureOf } from '@/lib/checker/notation/structure';

const symbols = {
  e: 'real',
  a: 'real',
  ab: 'real',
  b: 'real',
  c: 'real',
  B: 'real',
  m: 'real',
  x: 'real',
  y: 'real',
  T: 'real',
  n: 'integer',
  theta: 'real',
  phi: 'real',
  omega: 'real',
  t: 'real',
} as const;
const { e: _charge, ...withoutCharge } = symbols;

function structures(text: string, kind: AnswerKind, charged: boolean): { main: string; others: readonly string[] } {
  const { tree, alternatives } = parse(text, { kind, symbols: charged ? symbols : withoutCharge });
  if (tree === null) throw new Error(`unreadable: ${text}`);
  return { main: structureOf(tree), others: alternatives.map(structureOf) };
}

/** Text, the reading by rule and the other common reading, both in plain spelling. */
const pairs: readonly (readonly [string, string, string, AnswerKind?, 'charge'?])[] = [
  ['eB/2m', '((e*B)/2)*m', '(e*B)/(2*m)', 'scalar', 'charge'],
  ['1/2 x', '(1/2)*x', '1/(2*x)'],
  ['x/a b', '(x/a)*b', 'x/(a*b)'],
  ['sin x/2', 'sin(x/2)', 'sin(x)/2'],
  ['cos ωt/2', 'cos(omega*t/2)', 'cos(omega*t)/2'],
  ['sin x/T', 'sin(x)/T', 'sin(x/T)'],
  ['sin x y', 'sin(x*y)', 'sin(x)*y'],
  ['sin x(1+y)', 'sin(x*(1+y))', 'sin(x)*(1+y)'],
  ['sin x^2', 'sin(x^2)', 'sin(x)^2'],
  ['sqrt2 x', 'sqrt(2*x)', 'sqrt(2)*x'],
  ['e^ix', 'exp(i)*x', 'exp(i*x)'],
  ['e^-iωt', 'exp(-i)*omega*t', 'exp(-(i*omega*t))'],
  ['e^-x/2', 'exp(-x)/2', 'exp(-(x/2))'],
  ['e^2x', 'exp(2)*x', 'exp(2*x)'],
  ['x^n y', '(x^n)*y', 'x^(n*y)'],
  ['2^1/2', '(2^1)/2', '2^(1/2)'],
  ['x^3/2', '(x^3)/2', 'x^(3/2)'],
  ['e^i(x+y)', 'exp(i)*(x+y)', 'exp(i*(x+y))'],
  ['√(x)^2', 'sqrt(x^2)', 'sqrt(x)^2'],
  ['abc', 'ab*c', 'a*b*c'],
  ['2e-3', '0.002', '2*e-3', 'scalar', 'charge'],
  ['x/2×10^3', 'x/2000', '(x/2)*10^3'],
  ['cos θ/2 |+>', 'cos(theta/2)*|+>', '(cos(theta)/2)*|+>', 'state'],
  ['e^iφ |->', 'exp(i)*phi*|->', 'exp(i*phi)*|->', 'state'],
];

describe('texts that people write both ways', () => {
  it.each(pairs.map(([text, rule, other, kind, charge]) => ({ text, rule, other, kind: kind ?? 'scalar', charge })))(
    '$text',
    ({ text, rule, other, kind, charge }) => {
      const { main, others } = structures(text, kind, charge === 'charge');
      expect(main).toBe(structures(rule, kind, charge === 'charge').main);
      expect(others).toContain(structures(other, kind, charge === 'charge').main);
      expect(new Set([main, ...others]).size).toBe(others.length + 1);
    },
  );

  it('gives both readings of each of two doubtful places', () => {
    const { others } = structures('e^iφ sin θ/2', 'scalar', false);
    const expected = ['exp(i*phi)*sin(theta/2)', 'exp(i)*phi*sin(theta)/2', 'exp(i*phi)*sin(theta)/2'];
    for (const text of expected) expect(others).toContain(structures(text, 'scalar', false).main);
  });

  it('points at the place and says how to write it', () => {
    const { diagnostics } = parse('x + e^iφ', { kind: 'scalar', symbols: withoutCharge });
    expect(diagnostics).toHaveLength(1);
    expect(diagnostics[0]).toMatchObject({ code: 'ambiguous', span: { start: 4, end: 8 } });
    expect(diagnostics[0]?.hint).toContain('brackets');
  });

  it.each([
    ['ħ/2 σ_x', 'operator'],
    ['1/√2 (1, i)', 'state'],
    ['x^2/4', 'scalar'],
    ['x^2 y', 'scalar'],
    ['sin 2θ cos φ', 'scalar'],
    ['\\sin \\omega t', 'scalar'],
    ['x/(2m) y', 'scalar'],
    ['\\frac{1}{2} x', 'scalar'],
    ['1/2 [[0,1],[1,0]]', 'operator'],
    ['e^{iφ}x', 'scalar'],
  ] as const)('%s has one reading', (text, kind) => {
    expect(structures(text, kind, false).others).toEqual([]);
  });
});
