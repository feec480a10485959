/**
 * What the production build sends to a student's browser: reader and answer field, never comparison, references or a
 * computer algebra system. tests/lib/student-imports.test.ts looks at the sources for the same.
 */
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';

const dist = process.env.HALFMARK_DIST_DIR ?? '.next';

/** Texts that stand in files a student may not get, and nowhere else; each is looked up in its file first. */
const marks: readonly (readonly [file: string, text: string])[] = [
  ['lib/checker/kinds/comparison.ts', 'high-precision witness'],
  ['lib/checker/slips/commutator-order.ts', 'commutator-order'],
  ['lib/checker/equivalence/modular.ts', 'modular'],
  ['node_modules/mathjs/lib/browser/math.js', 'mathjs'],
  ['node_modules/nerdamer/nerdamer.core.js', 'nerdamer'],
];

/** The scripts of a page: those it loads at once, and those that they load later. */
function scriptsOf(page: string): Map<string, string> {
  const manifest = readFileSync(path.join(dist, 'server/app', page, 'page_client-reference-manifest.js'), 'utf8');
  const scripts = new Map<string, string>();
  const waiting = [manifest];
  for (let text = waiting.pop(); text !== undefined; text = waiting.pop()) {
    for (const [name] of text.matchAll(/static\/chunks\/[\w.~-]+\.js/g)) {
      if (scripts.has(name)) continue;
      const source = readFileSync(path.join(dist, name), 'utf8');
      scripts.set(name, source);
      waiting.push(source);
    }
  }
  return scripts;
}

describe.each([['(student)/work/[setId]'], ['(student)/work/(list)'], ['(tools)/reading']])('the page %s', (page) => {
  const scripts = scriptsOf(page);

  it('loads its scripts', () => {
    expect(scripts.size).toBeGreaterThan(3);
  });

  it.each(marks)('holds nothing of %s', (file, text) => {
    expect(readFileSync(file, 'utf8').includes(text)).toBe(true);
    const found = [...scripts].filter(([, source]) => source.includes(text)).map(([name]) => name);
    expect(found).toEqual([]);
  });
});

describe('the page on which answers are typed', () => {
  it('brings the reader, in less than 110 kB of scripts before the typesetter', () => {
    const scripts = [...scriptsOf('(student)/work/[setId]')];
    expect(scripts.some(([, source]) => source.includes('is not known in this question'))).toBe(true);
    const typesetter = scripts.filter(([, source]) => source.includes('KaTeX')).map(([name]) => name);
    const bytes = scripts
      .filter(([name]) => !typesetter.includes(name))
      .reduce((sum, [, source]) => sum + gzipSync(source).length, 0);
    expect(bytes).toBeLessThan(110_000);
  });
});
