import katex from 'katex';
import { describe, expect, it } from 'vitest';
import { type AnswerTree } from '@/lib/checker/notation/answer-tree';
import { parse } from '@/lib/checker/notation/parse';
import { printLatex } from '@/lib/checker/notation/print-latex';
import { printPlain } from '@/lib/checker/notation/print-plain';
import { structureOf } from '@/lib/checker/notation/structure';
import { read } from '@/lib/checker/reader';
import { contextOf, loadCases, type ValidCase } from './corpus';
import { spansOf } from './walk';

const cases = loadCases<ValidCase>('valid');

function treeOf(text: string, testCase: ValidCase): AnswerTree {
  const { tree, diagnostics } = parse(text, contextOf(testCase));
  if (tree === null) throw new Error(`${text}: ${diagnostics.map(({ code, message }) => `${code} ${message}`).join()}`);
  return tree;
}

describe('texts that must be read', () => {
  it('has at least 200 cases with ids of their own', () => {
    expect(cases.length).toBeGreaterThanOrEqual(200);
    expect(new Set(cases.map(({ id }) => id)).size).toBe(cases.length);
  });

  describe.each(cases)('$id $text', (testCase) => {
    const { text, same } = testCase;

    it('has the structure of its plain spelling', () => {
      expect(structureOf(treeOf(text, testCase))).toBe(structureOf(treeOf(same, testCase)));
    });

    it('is ambiguous exactly where the case says so', () => {
      const { ambiguous, alternatives, diagnostics } = parse(text, contextOf(testCase));
      expect(ambiguous).toBe(testCase.ambiguous === true);
      expect(alternatives.length > 0).toBe(ambiguous);
      expect(diagnostics.map(({ code }) => code)).toEqual(ambiguous ? ['ambiguous'] : []);
    });

    it('prints LaTeX that typesets and reads back to the same structure, without doubt', () => {
      const tree = treeOf(text, testCase);
      const latex = printLatex(tree);
      expect(katex.renderToString(latex, { throwOnError: true, strict: 'error', trust: false })).toContain('katex');
      if (testCase.kind === 'choice') return;
      const again = parse(latex, contextOf(testCase));
      expect(again.diagnostics).toEqual([]);
      expect(again.tree && structureOf(again.tree)).toBe(structureOf(tree));
      expect(again.tree && printLatex(again.tree)).toBe(latex);
    });

    it('has spans that lie in the text and nest', () => {
      const length = [...text].length;
      for (const { inner, outer } of spansOf(treeOf(text, testCase))) {
        expect(inner.start).toBeGreaterThanOrEqual(outer?.start ?? 0);
        expect(inner.end).toBeLessThanOrEqual(outer?.end ?? length);
        expect(inner.start).toBeLessThan(inner.end);
      }
    });

    it('reads the same through the small door, with words for a screen reader', () => {
      const tree = treeOf(text, testCase);
      const reading = read(text, contextOf(testCase));
      expect(reading.readable).toBe(true);
      expect(reading.latex).toBe(printLatex(tree));
      expect(reading.plain).toBe(printPlain(tree));
      expect(reading.plain).not.toMatch(/[\\{}^_|<>]|undefined|\[object/);
    });
  });
});
