import { describe, expect, it } from 'vitest';
import { casesOf, corpusFiles, unmet } from './corpus';

describe('the labelled corpus', () => {
  for (const file of [...corpusFiles('equivalence'), ...corpusFiles('published')]) {
    it(`meets every label of ${file}`, () => {
      const cases = casesOf(file);
      expect(cases.length).toBeGreaterThan(0);
      expect(cases.map(unmet).filter((problem) => problem !== null)).toEqual([]);
    }, 120_000);
  }
});
