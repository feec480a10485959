import { describe, expect, it } from 'vitest';
import { type AnswerKind, type Symbols } from '@/lib/checker/notation/answer-tree';
import { parse } from '@/lib/checker/notation/parse';
import { printLatex } from '@/lib/checker/notation/print-latex';
import { structureOf } from '@/lib/checker/notation/structure';

const symbols: Symbols = { x: 'real', e: 'real', a_0: 'real', T: 'real' };

/** One piece of every sort that the tokeniser knows. */
const pieces = [
  'x',
  'e',
  'a_',
  '0',
  '2',
  '1e3',
  '.5',
  'i',
  'T',
  'I',
  'S_',
  '+',
  '-',
  '±',
  '*',
  '/',
  '^',
  '_',
  '(',
  ')',
  '[',
  ']',
  '{',
  '}',
  ',',
  ';',
  ':',
  '=',
  '|',
  '|->',
  '<+|',
  '>',
  '<',
  "'",
  '†',
  '√',
  '½',
  '²',
  '₁',
  'sin',
  'sqrt',
  'abs',
  '\\frac',
  '\\sqrt',
  '\\left',
  '\\mathrm',
  '\\hat',
  '\\begin{pmatrix}',
  '\\end{pmatrix}',
  '&',
  '\\\\',
  '$',
  ' ',
  '.',
  'foo',
];

const kinds: readonly AnswerKind[] = ['scalar', 'operator', 'state', 'eigenvalues', 'eigenpairs', 'vector', 'quantity'];

/** Kinds in which texts of three pieces are tried: the one with inline columns, and the one with labels and signs. */
const longKinds: readonly AnswerKind[] = ['state', 'eigenvalues'];

interface Count {
  read: number;
  unstable: string[];
  silent: string[];
}

function check(text: string, kind: AnswerKind, count: Count): void {
  const { tree, diagnostics } = parse(text, { kind, symbols });
  if (tree === null) {
    if (diagnostics.length !== 1) count.silent.push(text);
    return;
  }
  count.read += 1;
  const again = parse(printLatex(tree), { kind, symbols });
  if (again.tree === null || structureOf(again.tree) !== structureOf(tree)) count.unstable.push(`${kind}: ${text}`);
}

describe('every short text', () => {
  it('of up to three pieces is read stably or refused with one reason', () => {
    const count: Count = { read: 0, unstable: [], silent: [] };
    for (const kind of kinds) {
      for (const one of pieces) {
        check(one, kind, count);
        for (const two of pieces) {
          check(one + two, kind, count);
          if (longKinds.includes(kind)) for (const three of pieces) check(one + two + three, kind, count);
        }
      }
    }
    expect(count.silent).toEqual([]);
    expect(count.unstable).toEqual([]);
    expect(count.read).toBeGreaterThan(2000);
  }, 120_000);

  it('of four and five pieces from a small alphabet', () => {
    const small = [
      'x',
      '2',
      '+',
      '-',
      '*',
      '/',
      '^',
      '(',
      ')',
      '|',
      ',',
      'S_',
      '{',
      '}',
      '|->',
      '<+|',
      'sin ',
      '²',
      '=',
    ];
    const count: Count = { read: 0, unstable: [], silent: [] };
    const extend = (text: string, left: number): void => {
      if (left === 0) check(text, kinds[count.read % 4] ?? 'scalar', count);
      else for (const piece of small) extend(text + piece, left - 1);
    };
    extend('', 4);
    for (const start of ['x', '(', '|', '<+|', 'sin ', '{']) extend(start, 4);
    expect(count.silent).toEqual([]);
    expect(count.unstable).toEqual([]);
    expect(count.read).toBeGreaterThan(1000);
  }, 120_000);
});
