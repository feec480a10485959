import { describe, expect, it } from 'vitest';
import { referenceOf, symbolsOfDraw } from '@/lib/templates/reference-of';
import { slipCreditsOf } from '@/lib/templates/slip-credits';
import { templateContent } from '../factories/template-content';

const content = templateContent();

describe('referenceOf', () => {
  it('puts operators and numbers in the place of their names', () => {
    const values = { n: '-3', A: 'S_x' };
    const texts = ['a', 'b', 'c'].map((key) => {
      const reference = referenceOf(content, key, values);
      return reference.ok ? reference.check.reference : reference.error;
    });
    expect(texts).toEqual([
      'commutator(S_x, S_x + S_y)',
      'eigenvalues((-3)*omega*S_x)',
      'expectation((-3)*omega*S_x, |+z>)',
    ]);
  });

  it('carries kind, symbols, options and expected wrong answers', () => {
    const wide = templateContent({
      symbols: [
        { name: 'omega', domain: 'positive' },
        { name: 'theta', domain: { between: ['0', 'n pi'] } },
      ],
      parts: [
        {
          ...content.parts[2]!,
          options: { answerForm: 'evaluated', upToPhase: true },
          expected: [{ id: 'forgot-n', expression: 'n hbar/2', share: 250, sentence: 'Once more.' }],
        },
      ],
    });
    expect(referenceOf(wide, 'c', { n: '2', A: 'S_z' })).toEqual({
      ok: true,
      check: {
        kind: 'scalar',
        reference: 'expectation(2*omega*S_z, |+z>)',
        symbols: { omega: 'positive', theta: { between: ['0', '2*pi'] } },
        options: {
          answerForm: 'evaluated',
          upToPhase: true,
          slips: [{ id: 'forgot-n', expression: '2*hbar/2' }],
        },
      },
    });
    expect(symbolsOfDraw(wide, { n: '2', A: 'S_z' })).toHaveProperty('theta', { between: ['0', '2*pi'] });
  });

  it('puts compound operators in brackets', () => {
    const reference = referenceOf(content, 'b', { n: '1', A: 'S_x + S_y' });
    expect(reference).toMatchObject({ ok: true, check: { reference: 'eigenvalues(1*omega*(S_x + S_y))' } });
  });

  it('puts numbers into a quantity', () => {
    const part = { ...content.parts[2]!, kind: 'quantity' as const, reference: 'n*21.29 MHz' };
    const reference = referenceOf(templateContent({ parts: [part] }), 'c', { n: '3', A: 'S_x' });
    expect(reference).toMatchObject({ ok: true, check: { reference: '(3*21.29) MHz' } });
  });

  it('says where and why a reference cannot be made', () => {
    expect(referenceOf(content, 'z', { n: '1', A: 'S_x' })).toMatchObject({ ok: false, place: 'key' });
    const broken = templateContent({ parts: [{ ...content.parts[2]!, reference: 'n omga' }] });
    expect(referenceOf(broken, 'c', { n: '1', A: 'S_x' })).toMatchObject({ ok: false, place: 'reference' });
    expect(referenceOf(content, 'c', { n: '1 +', A: 'S_x' })).toMatchObject({ ok: false, place: 'reference' });
    const mistyped = templateContent({ parts: [{ ...content.parts[2]!, reference: '|+>' }] });
    expect(referenceOf(mistyped, 'c', { n: '1', A: 'S_x' })).toMatchObject({ ok: false, place: 'reference' });
  });
});

describe('slipCreditsOf', () => {
  it('puts expected wrong answers before the catalogue', () => {
    const part = {
      slips: [
        { slip: 'sign', share: 500 },
        { slip: 'missing-i', share: 'person' as const },
      ],
      expected: [{ id: 'forgot-n', expression: '1', share: 250, sentence: '' }],
    };
    expect(slipCreditsOf(part)).toEqual([
      { slip: 'forgot-n', share: 250 },
      { slip: 'sign', share: 500 },
      { slip: 'missing-i', share: 'person' },
    ]);
  });
});
