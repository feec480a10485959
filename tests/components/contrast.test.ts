import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';

const css = readFileSync(join(import.meta.dirname, '../../app/globals.css'), 'utf8');

/** Every colour token with its two values, as the stylesheet has them. */
const tokens = new Map(
  [...css.matchAll(/--color-([a-z-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\);/g)].map(
    ([, name, paper, night]) => [name ?? '', { paper: paper ?? '', night: night ?? '' }],
  ),
);

/** Relative luminance of an sRGB colour, WCAG 2.2, section "relative luminance". */
function luminance(colour: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((at) => {
    const channel = parseInt(colour.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(first: string, second: string): number {
  const [light = 1, dark = 0] = [luminance(first), luminance(second)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

describe('the colours of the page', () => {
  it('are measured as WCAG does', () => {
    expect(contrast('#ffffff', '#000000')).toBeCloseTo(21, 5);
    expect(contrast('#777777', '#ffffff')).toBeCloseTo(4.48, 2);
  });

  const grounds = ['paper', 'field', 'wash'];
  const words = ['ink', 'blue', 'verdigris', 'madder', 'ochre', 'grey'];
  const pairs: [string, string, number][] = [
    ...grounds.flatMap((ground) => words.map((word): [string, string, number] => [word, ground, 4.5])),
    ...grounds.map((ground): [string, string, number] => ['edge', ground, 3]),
    ['on-blue', 'blue', 4.5],
    ['on-madder', 'madder', 4.5],
  ];
  for (const theme of ['paper', 'night'] as const) {
    it(`are readable on ${theme}: 4.5 for words, 3 for the edges of controls`, () => {
      for (const [front, ground, least] of pairs) {
        const ratio = contrast(tokens.get(front)?.[theme] ?? '', tokens.get(ground)?.[theme] ?? '');
        expect(ratio, `${front} on ${ground}`).toBeGreaterThanOrEqual(least);
      }
    });
  }
});
