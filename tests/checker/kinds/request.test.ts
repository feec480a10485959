import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { check } from '@/lib/checker/index';

const good = { id: 'a', kind: 'scalar', reference: '1', answer: '1' };

const errorOf = (request: unknown): string | null => {
  const outcome = check(request);
  return 'error' in outcome ? outcome.error : null;
};

describe('a bad request', () => {
  it.each([
    ['no object', 3],
    ['an unknown field', { ...good, colour: 'red' }],
    ['an unknown kind', { ...good, kind: 'tensor' }],
    ['an unknown option', { ...good, options: { upToSign: true } }],
    ['an option of the wrong type', { ...good, options: { upToPhase: 'yes' } }],
    ['two tolerances', { ...good, options: { tolerance: { relative: 0.1, absolute: 1 } } }],
    ['a long id', { ...good, id: 'x'.repeat(201) }],
    ['an unknown domain', { ...good, symbols: { x: 'rational' } }],
    ['an undeclared reference', { ...good, reference: 'y' }],
    ['an unreadable reference', { ...good, reference: '1 +' }],
    ['a reference defined nowhere', { ...good, reference: '1/(1-1)' }],
    ['a relative tolerance with reference 0', { ...good, reference: '0', options: { tolerance: { relative: 0.1 } } }],
    ['an unnormalised state', { ...good, reference: 'expectation(S_z, (1, 1))' }],
    ['an unreadable assumption', { ...good, options: { assume: ['x = '] } }],
    ['an empty interval', { ...good, reference: 'x', symbols: { x: { between: ['1', '0'] } } }],
  ])('is refused with a sentence: %s', (_, request) => {
    expect(errorOf(request)).toMatch(/\.$/);
  });

  it('keeps its id where it has one', () => {
    expect(check({ ...good, kind: 'x' })).toMatchObject({ id: 'a' });
    expect(check(null)).toMatchObject({ id: null });
  });
});

describe('any request', { timeout: 60_000 }, () => {
  it('is answered without a throw, and the same twice', () => {
    const pieces = fc.constantFrom(
      'x',
      '+',
      '-',
      '*',
      '/',
      '^',
      '(',
      ')',
      'sqrt',
      'sin',
      'exp',
      'i',
      'pi',
      'hbar',
      '0',
      '2',
      '1/3',
      'abs',
      '|',
      '>',
      '<',
      '[',
      ']',
      ',',
      'S_x',
      'ln',
      ' ',
      '0.5',
      'sigma_y',
      '{',
      '}',
      'constructor',
      '__proto__',
      '\\frac',
      '_',
    );
    const text = fc.array(pieces, { maxLength: 14 }).map((parts) => parts.join(''));
    const kind = fc.constantFrom(
      'scalar',
      'operator',
      'pauli',
      'eigenvalues',
      'state',
      'eigenpairs',
      'vector',
      'quantity',
    );
    fc.assert(
      fc.property(
        kind,
        text,
        text,
        fc.constantFrom('real', 'positive', 'complex', 'integer'),
        (of, reference, answer, domain) => {
          const request = { id: 'p', kind: of, reference, answer, symbols: { x: domain } };
          expect(check(request)).toEqual(check(request));
        },
      ),
      { numRuns: 3000 },
    );
  });

  it('never runs past its work limit', () => {
    const outcome = check({
      id: 'w',
      kind: 'scalar',
      reference: '(a+b+c)^40*(a-b)^40',
      answer: '(a-b)^40*(a+b+c)^40',
      symbols: { a: 'real', b: 'real', c: 'real' },
      options: { budgetSteps: 5 },
    });
    expect(outcome).toMatchObject({ verdict: 'undecided' });
    for (const monster of [
      '9^9^9^9',
      '(1+x)^999999999',
      '2^(2^(2^(2^x)))',
      `${'sqrt('.repeat(90)}x${')'.repeat(90)}`,
    ]) {
      const started = performance.now();
      check({ id: 'm', kind: 'scalar', reference: 'x', answer: monster, symbols: { x: 'real' } });
      expect(performance.now() - started).toBeLessThan(10_000);
    }
  });
});
