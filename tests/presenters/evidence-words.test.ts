import { describe, expect, it } from 'vitest';
import { check } from '@/lib/checker';
import { evidenceInWords } from '@/lib/presenters/evidence-words';

function wordsOf(request: { kind: 'scalar' | 'operator' | 'quantity'; reference: string; answer: string }): string[] {
  const outcome = check({ id: 'one', symbols: { omega: 'positive' }, ...request });
  if ('error' in outcome) throw new Error(outcome.error);
  return evidenceInWords(outcome.verdict, outcome.evidence);
}

describe('evidence in words', () => {
  it('states the exact argument and its bound', () => {
    expect(wordsOf({ kind: 'scalar', reference: 'omega + omega', answer: '2 omega' })).toEqual([
      'Both sides reduce to the same form: an exact argument.',
    ]);
    const [sentence] = wordsOf({
      kind: 'scalar',
      reference: '(omega + 1)^3',
      answer: '(omega^2 + 2 omega + 1)(omega + 1)',
    });
    expect(sentence).toMatch(
      /^(Equal by an exact test in \d+ prime fields \(chance of an error at most 10\^−\d+\)|Both sides)/,
    );
  });

  it('gives the witness with both sides, a true minus sign, and which elements differ', () => {
    const words = wordsOf({ kind: 'operator', reference: 'hbar*omega*sigma_x', answer: '-hbar omega sigma_x' }).join(
      ' ',
    );
    expect(words).toContain('2 elements differ: row 1, column 2; row 2, column 1.');
    expect(words).toMatch(
      /At ħ = [\d.]+, ω = [\d.]+ row 1, column 2 of the answer is −[\d.]+, that of the reference [\d.]+\./,
    );
  });

  it('says the tolerance of a quantity and how far off it is', () => {
    const words = wordsOf({ kind: 'quantity', reference: '63.87 MHz', answer: '65 MHz' }).join(' ');
    expect(words).toMatch(/tolerance/i);
  });
});
