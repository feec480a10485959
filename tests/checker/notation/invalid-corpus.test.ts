import { describe, expect, it } from 'vitest';
import { diagnosticCodes } from '@/lib/checker/diagnostics';
import { parse } from '@/lib/checker/notation/parse';
import { read } from '@/lib/checker/reader';
import { contextOf, loadCases, type InvalidCase } from './corpus';

const cases = loadCases<InvalidCase>('invalid');

describe('texts that must not be read', () => {
  it('has at least 200 cases with ids of their own', () => {
    expect(cases.length).toBeGreaterThanOrEqual(200);
    expect(new Set(cases.map(({ id }) => id)).size).toBe(cases.length);
  });

  it('meets every code but those of the limits and of conditions', () => {
    const met = new Set(cases.map(({ code }) => code));
    const elsewhere = ['ambiguous', 'comparison', 'too-deep', 'too-long', 'too-many-nodes'];
    expect(diagnosticCodes.filter((code) => !met.has(code))).toEqual(elsewhere);
  });

  describe.each(cases)('$id $text', (testCase) => {
    const { text, code, span } = testCase;

    it('says what and where', () => {
      const { tree, diagnostics, alternatives } = parse(text, contextOf(testCase));
      expect(tree).toBeNull();
      expect(alternatives).toEqual([]);
      expect(diagnostics.map((diagnostic) => [diagnostic.code, diagnostic.span.start, diagnostic.span.end])).toEqual([
        [code, ...span],
      ]);
    });

    it('says it in a sentence, and shows nothing', () => {
      const { readable, latex, plain, diagnostics } = read(text, contextOf(testCase));
      expect([readable, latex, plain]).toEqual([false, '', '']);
      for (const { message, hint, span: place } of diagnostics) {
        expect(message).toMatch(/^.[^]*\.$/u);
        expect(message).not.toMatch(/undefined|\[object| {2}/);
        expect(hint ?? 'Whole.').toMatch(/[.?]$/);
        expect(place.start).toBeLessThanOrEqual(place.end);
        expect(place.end).toBeLessThanOrEqual([...text].length);
      }
    });
  });
});
