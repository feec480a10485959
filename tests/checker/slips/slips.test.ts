import { describe, expect, it } from 'vitest';
import { type AnswerKind, type CheckOptions, type SymbolTable } from '@/lib/checker/contract';
import { sentenceOf, slipIds } from '@/lib/checker/index';
import { ask } from '../kinds/ask';

const symbols: SymbolTable = {
  a: 'real',
  b: 'real',
  c: 'real',
  x: 'positive',
  y: 'positive',
  theta: 'real',
  omega: 'positive',
};

/** A slip, a kind it fits, the reference and an answer with the slip. */
const rows: readonly (readonly [string, AnswerKind, string, string, CheckOptions?])[] = [
  ['sign', 'scalar', 'a + i b', '-a - i b'],
  ['sign', 'operator', 'a + b sigma_x', '-a - b sigma_x'],
  ['sign', 'eigenvalues', '{a, b}', '{-a, -b}'],
  ['sign', 'state', '(a, i b)', '(-a, -i b)'],
  ['sign', 'vector', '(a, b, 0)', '(-a, -b, 0)'],
  ['sign', 'pauli', '(a, b, 0, 0)', '(-a, -b, 0, 0)'],
  ['sign', 'eigenpairs', 'a: |+>; b: |->', '-a: |+>; -b: |->'],
  ['factor-half', 'scalar', 'a + b', '(a + b)/2'],
  ['factor-two', 'operator', 'S_x', 'hbar sigma_x'],
  ['hbar-power', 'scalar', 'hbar omega', 'omega'],
  ['hbar-power', 'operator', 'i hbar S_z', 'i S_z'],
  ['missing-i', 'scalar', 'exp(i theta)', 'exp(theta)'],
  ['missing-i', 'scalar', 'cos(theta) + i sin(theta)', 'cos(theta) + sin(theta)'],
  ['missing-i', 'operator', 'i hbar S_y', 'hbar S_y'],
  ['missing-i', 'scalar', 'hbar omega', 'i hbar omega'],
  ['conjugated', 'state', '(a, i b)', '(a, -i b)'],
  ['conjugated', 'operator', '[[a, i b], [c, 0]]', '[[a, -i b], [c, 0]]'],
  ['transposed', 'operator', '[[a, b], [c, 0]]', '[[a, c], [b, 0]]'],
  ['commutator-order', 'operator', 'commutator(S_x, S_y) + S_x', '-i hbar S_z + S_x'],
  ['half-angle', 'scalar', 'cos(theta)', 'cos(theta/2)'],
  ['half-angle', 'operator', 'exp(-i theta sigma_x)', 'exp(-i theta sigma_x/2)'],
  ['double-angle', 'scalar', 'sin(theta/2)^2', 'sin(theta)^2'],
  ['sine-cosine', 'scalar', 'cos(theta)', 'sin(theta)'],
  ['sine-cosine', 'state', '(cos(theta), sin(theta))', '(sin(theta), cos(theta))'],
  ['missing-two-pi', 'scalar', 'omega', 'omega/(2 pi)'],
  ['rounded-decimal', 'state', '(1, 1)/sqrt(2)', '(0.707, 0.707)'],
  ['axes-permuted', 'operator', 'a sigma_x + b sigma_y + c sigma_z', 'a sigma_y + b sigma_z + c sigma_x'],
  ['axes-permuted', 'vector', '(a, b, c)', '(a, c, b)'],
  ['missing-root', 'scalar', 'sqrt(a^2 + b^2)', 'a^2 + b^2'],
  ['missing-root', 'scalar', 'uncertainty(S_z, |+x>)', 'hbar^2/4'],
  ['missing-constant', 'operator', 'a + b sigma_x', 'b sigma_x'],
  ['one-eigenvalue', 'eigenvalues', '{a, b}', 'b'],
  ['centred-eigenvalues', 'eigenvalues', '{a + b, a - b}', '±b'],
  ['states-swapped', 'eigenpairs', 'a: |+>; b: |->', 'a: |->; b: |+>'],
  ['not-normalised', 'state', '|+y>', '(1, i)'],
  ['pauli-for-spin', 'operator', 'S_x + S_y', 'sigma_x + sigma_y'],
  ['spin-for-pauli', 'operator', 'sigma_x - sigma_z', 'S_x - S_z'],
  ['power-of-ten', 'quantity', '63.87 MHz', '6.387 MHz'],
  ['wrong-unit', 'quantity', '63.87 MHz', '63.87 kHz'],
];

describe('the catalogue of slips', () => {
  for (const [slip, kind, reference, answer, options] of rows) {
    it(`${slip} of ${kind} ${reference}`, () => {
      const { verdict, slips, kinKey } = ask(kind, reference, answer, symbols, options);
      expect(verdict).toBe('differs');
      expect(slips).toContain(slip);
      expect(kinKey).toBe(`slip:${slips[0]}`);
    });
  }

  it('has a test of every id', () => {
    expect(new Set(rows.map(([id]) => id))).toEqual(new Set(slipIds));
  });

  it('reports all that coincide, in catalogue order', () => {
    expect(ask('operator', 'i hbar S_z', '-i hbar S_z').slips).toEqual(['sign', 'conjugated', 'commutator-order']);
    expect(ask('operator', '[S_x, S_y] + S_x', '-i hbar S_z + S_x').slips).toContain('commutator-order');
  });

  it('names two at once where neither explains the answer', () => {
    expect(ask('scalar', 'hbar omega', '-2 hbar omega', symbols).slips).toEqual(['sign+factor-two']);
    expect(ask('scalar', 'cos(theta)', '-sin(theta)', symbols).slips).toContain('sign+sine-cosine');
  });

  it('puts the author’s own first', () => {
    const slips = [{ id: 'used-wrong-field', expression: '-hbar omega' }];
    expect(ask('scalar', 'hbar omega', '-hbar omega', symbols, { slips }).slips).toEqual(['used-wrong-field', 'sign']);
    expect(ask('scalar', 'hbar omega', '-hbar omega', symbols, { slips }).slip).toBe('used-wrong-field');
  });

  it('finds none in an answer that is merely wrong', () => {
    const { slips, kinKey } = ask('scalar', 'hbar omega', 'x^3 + y', symbols);
    expect([slips, kinKey]).toEqual([[], null]);
  });

  it('has a sentence for every slip and pair', () => {
    for (const id of slipIds) expect(sentenceOf(id)).not.toContain('foresaw');
    expect(sentenceOf('sign+factor-two')).toContain(', and ');
  });
});

describe('the kin key', () => {
  it('is shared by answers that are wrong alike under different draws', () => {
    expect(ask('scalar', '3 x/4', 'x/5', symbols).kinKey).toBe('ratio:4/15');
    expect(ask('operator', 'a sigma_x', 'a sigma_x + 3/7', symbols).kinKey).toBe('identity:3/7');
    expect(ask('operator', 'a sigma_x + b sigma_y', 'b sigma_x - a sigma_y', symbols).kinKey).toMatch(/^axes:/);
    expect(ask('scalar', 'a', '1 +', symbols).kinKey).toBe(ask('scalar', 'a', ' 1+ ', symbols).kinKey);
  });
});
