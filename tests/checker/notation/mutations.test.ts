import fc from 'fast-check';
import katex from 'katex';
import { describe, expect, it } from 'vitest';
import { parse } from '@/lib/checker/notation/parse';
import { printLatex } from '@/lib/checker/notation/print-latex';
import { printPlain } from '@/lib/checker/notation/print-plain';
import { structureOf } from '@/lib/checker/notation/structure';
import { contextOf, loadCases, type ValidCase } from './corpus';

const cases = loadCases<ValidCase>('valid').filter(({ kind }) => kind !== 'choice');
const pieces = [
  '+',
  '-',
  '*',
  '/',
  '^',
  '(',
  ')',
  '{',
  '}',
  '|',
  ' ',
  ',',
  '2',
  'i',
  'x',
  '½',
  '²',
  '×10^3',
  'sin ',
  '√',
  '|+>',
  '<-|',
  'S_x',
  '=',
];

/** A place in a text as a share of its length, what goes in there, and how many characters go out. */
const change = fc.record({
  place: fc.double({ min: 0, max: 1, noNaN: true }),
  put: fc.constantFrom('', ...pieces),
  drop: fc.nat(3),
});

describe('corpus texts with a few changes', () => {
  it('print, in every reading, as LaTeX that typesets and reads back to the same structure without doubt', () => {
    let read = 0;
    fc.assert(
      fc.property(fc.constantFrom(...cases), fc.array(change, { minLength: 1, maxLength: 3 }), (testCase, changes) => {
        let { text } = testCase;
        for (const { place, put, drop } of changes) {
          const at = Math.floor(place * text.length);
          text = text.slice(0, at) + put + text.slice(at + drop);
        }
        const { tree, alternatives } = parse(text, contextOf(testCase));
        if (tree === null) return;
        read += 1;
        for (const reading of [tree, ...alternatives]) {
          const latex = printLatex(reading);
          const again = parse(latex, contextOf(testCase));
          expect(again.diagnostics).toEqual([]);
          expect(again.tree && structureOf(again.tree)).toBe(structureOf(reading));
          expect(() =>
            katex.renderToString(latex, { throwOnError: true, strict: 'error', trust: false }),
          ).not.toThrow();
          expect(printPlain(reading)).not.toMatch(/[\\{}^_|<>]|undefined/);
        }
      }),
      { numRuns: 6000 },
    );
    expect(read).toBeGreaterThan(600);
  }, 60_000);
});
