import { describe, expect, it } from 'vitest';
import { parse } from '@/lib/checker/notation/parse';
import { structureOf } from '@/lib/checker/notation/structure';
import { type AnswerKind } from '@/lib/checker/notation/answer-tree';

const symbols = { a: 'real', b: 'real', x: 'real', theta: 'real' } as const;

/** Trees written out by hand: the anchor of the corpora, whose cases compare two readings with each other. */
const trees: readonly (readonly [AnswerKind, string, string])[] = [
  ['scalar', 'a', "'a"],
  ['scalar', '2.50', '25e-1'],
  ['scalar', '1200', '12e2'],
  ['scalar', 'a - b + 2', "(sum + 'a - 'b + 2)"],
  ['scalar', '-a', "(sum - 'a)"],
  ['scalar', 'a*b/2', "(/ (* 'a 'b) 2)"],
  ['scalar', 'a/2*b', "(* (/ 'a 2) 'b)"],
  ['scalar', 'a/(2*b)', "(/ 'a (* 2 'b))"],
  ['scalar', '-a^2', "(sum - (^ 'a 2))"],
  ['scalar', '(-a)^2', "(^ (sum - 'a) 2)"],
  ['scalar', 'a^b^2', "(^ 'a (^ 'b 2))"],
  ['scalar', 'exp(i*x)', "(exp (* i 'x))"],
  ['scalar', 'sqrt(x)', "(root2 'x)"],
  ['scalar', 'abs(x)', "(absolute 'x)"],
  ['scalar', 'conj(x)', "(conjugate 'x)"],
  ['scalar', 'log(x)', "(ln 'x)"],
  ['scalar', 'atan2(a, b)', "(atan2 'a 'b)"],
  ['scalar', 'cos(theta)^2', "(^ (cos 'theta) 2)"],
  ['scalar', 'hbar*pi*h', '(* (* hbar pi) planck)'],
  ['scalar', '<+|*S_x*|->', '(* (* <+z| spin_x) |-z>)'],
  ['operator', 'S_x*sigma_y', '(* spin_x pauli_y)'],
  ['operator', 'a + b*I', "(sum + 'a + (* 'b identity))"],
  ['operator', '[[1, 2],[3, 4]]', '[1 2; 3 4]'],
  ['operator', '[S_x, S_y]', '(commutator spin_x spin_y)'],
  ['operator', '{S_x, S_y}', '(anticommutator spin_x spin_y)'],
  ['operator', 'S_+^†', '(adjoint spin_+)'],
  ['operator', 'sigma_y^T', '(transpose pauli_y)'],
  ['operator', '|+x>*<-y|', '(* |+x> <-y|)'],
  ['state', '(1, i)', '[1; i]'],
  ['state', 'a*|0> + b*|1>', "(sum + (* 'a |+z>) + (* 'b |-z>))"],
  ['eigenvalues', '{a, -a}', "values('a, (sum - 'a))"],
  ['eigenvalues', 'a ± b', "values((sum + 'a ± 'b))"],
  ['eigenpairs', 'a: |+>; -a: |->', "pairs('a: |+z>; (sum - 'a): |-z>)"],
  ['vector', '(a, 0, 1)', "list('a, 0, 1)"],
  ['pauli', '(0, a, 0, 1)', "list(0, 'a, 0, 1)"],
  ['quantity', '1.5 mT', 'quantity(15e-1, mT^1)'],
  ['quantity', '2 rad/s', 'quantity(2, rad^1 s^-1)'],
  ['quantity', '2', 'quantity(2, none)'],
];

describe('trees of plain spellings', () => {
  it.each(trees)('%s %s', (kind, text, structure) => {
    const { tree } = parse(text, { kind, symbols });
    expect(tree && structureOf(tree)).toBe(structure);
  });
});

describe('numbers', () => {
  it.each([
    ['0.50', 50n, 100n, 2, 2, true],
    ['63.87', 6387n, 100n, 4, 2, true],
    ['100', 100n, 1n, 3, 0, false],
    ['0.070', 70n, 1000n, 2, 3, true],
    ['1e3', 1000n, 1n, 1, 0, false],
    ['1.20e-2', 120n, 10000n, 3, 2, true],
    ['2×10^2', 200n, 1n, 1, 0, false],
    ['0', 0n, 1n, 1, 0, false],
  ])('%s keeps its exact value and its figures', (text, numerator, denominator, figures, decimals, decimal) => {
    const { tree } = parse(text, { kind: 'scalar', symbols });
    expect(tree).toMatchObject({ numerator, denominator, significantFigures: figures, decimals, decimal });
  });
});
