import { describe, expect, it } from 'vitest';
import { type AnswerKind } from '@/lib/checker/notation/answer-tree';
import { parse } from '@/lib/checker/notation/parse';
import { printLatex } from '@/lib/checker/notation/print-latex';
import { structureOf } from '@/lib/checker/notation/structure';
import { referenceNames } from '@/lib/checker/notation/vocabulary';
import { read } from '@/lib/checker/reader';

const symbols = { a: 'real', theta: 'real', phi: 'real', t: 'real', gamma: 'real', B: 'real', T: 'positive' } as const;

const calls: readonly (readonly [AnswerKind, string])[] = [
  ['operator', 'commutator(S_x, S_y)'],
  ['operator', 'anticommutator(S_x, a)'],
  ['eigenvalues', 'eigenvalues(a*sigma_x)'],
  ['eigenpairs', 'eigenpairs([[0, 1],[1, 0]])'],
  ['scalar', 'trace(S_x*S_x)'],
  ['scalar', 'determinant(sigma_z)'],
  ['operator', 'adjoint(S_+)'],
  ['pauli', 'pauli(S_x + a)'],
  ['scalar', 'expectation(S_z, (cos(theta), sin(theta)))'],
  ['scalar', 'expectation(S_z, (1/2)*I)'],
  ['scalar', 'variance(S_z, |+x>)'],
  ['scalar', 'uncertainty(S_z, |+x>)'],
  ['scalar', 'probability(|+>, spinor(theta, phi))'],
  ['operator', 'projector(|+x>)'],
  ['operator', 'density((1, i))'],
  ['vector', 'bloch(|+y>)'],
  ['scalar', 'purity(density(|+>))'],
  ['scalar', 'entropy((1/2)*I)'],
  ['state', 'spinor(theta, phi)'],
  ['operator', 'rotation((0, 0, 1), theta)'],
  ['operator', 'propagator(a*S_x, t)'],
  ['state', 'evolve(a*S_x, t, |+>)'],
  ['operator', 'heisenberg(S_x, a*S_z, t)'],
  ['operator', 'larmor(gamma, (0, 0, B))'],
  ['scalar', 'rabi(a, B, t)'],
  ['operator', 'thermal(a*S_z, T)'],
];

describe('reference functions', () => {
  it('covers every one', () => {
    const called = new Set(calls.map(([, text]) => text.slice(0, text.indexOf('('))));
    expect(referenceNames.filter((name) => !called.has(name))).toEqual([]);
  });

  it.each(calls)('%s %s is read in a reference and never in an answer', (kind, text) => {
    const { tree, diagnostics } = parse(text, { kind, symbols, allowReferenceFunctions: true });
    expect(diagnostics).toEqual([]);
    if (tree === null) throw new Error('unreadable');
    const name = text.slice(0, text.indexOf('('));
    expect(structureOf(tree)).toContain(`${name}(`);
    const again = parse(printLatex(tree), { kind, symbols, allowReferenceFunctions: true });
    expect(again.tree && structureOf(again.tree)).toBe(structureOf(tree));
    const answer = read(text, { kind, symbols, allowReferenceFunctions: true });
    expect(answer.readable).toBe(false);
    expect(answer.diagnostics[0]?.code).toBe('reference-function');
  });

  it.each([
    ['scalar', 'expectation(S_z)', 'argument-count'],
    ['scalar', 'expectation(S_z, a)', 'bad-argument'],
    ['scalar', 'probability(S_x, |+>)', 'bad-argument'],
    ['operator', 'projector(S_x)', 'bad-argument'],
    ['operator', 'rotation((0, 1), theta)', 'bad-argument'],
    ['operator', 'thermal(S_z, S_z)', 'bad-argument'],
    ['scalar', 'trace S_x', 'undeclared-name'],
    ['state', 'eigenvalues(S_x)', 'wrong-kind'],
    ['vector', 'pauli(S_x)', 'value-count'],
  ] as const)('%s %s is refused', (kind, text, code) => {
    const { tree, diagnostics } = parse(text, { kind, symbols, allowReferenceFunctions: true });
    expect(tree).toBeNull();
    expect(diagnostics.map((diagnostic) => diagnostic.code)).toEqual([code]);
  });

  it('keeps the argument places apart: a list is a state only where one is expected', () => {
    const { tree } = parse('expectation(S_z, (1, i)) + rabi(a, B, t)', {
      kind: 'scalar',
      symbols,
      allowReferenceFunctions: true,
    });
    expect(tree && structureOf(tree)).toBe("(sum + expectation(spin_z, [1; i]) + rabi('a, 'B, 't))");
  });
});
