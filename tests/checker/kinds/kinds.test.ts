import { describe, expect, it } from 'vitest';
import { ask, verdictOf } from './ask';

const real = { a: 'real', b: 'real', a0: 'real', x: 'real', theta: 'real', phi: 'real' } as const;

describe('scalars', () => {
  it('are equal over the whole domain or differ at a witness in it', () => {
    expect(verdictOf('scalar', 'x', 'sqrt(x^2)', { x: 'real' })).toBe('differs');
    expect(verdictOf('scalar', 'x', 'sqrt(x^2)', { x: 'nonnegative' })).toBe('agrees');
    expect(verdictOf('scalar', 'cos(n*pi)', '(-1)^n', { n: 'integer' })).toBe('agrees');
    expect(verdictOf('scalar', 'cos(n*pi)', '(-1)^n', { n: 'real' })).toBe('differs');
    const half = ['scalar', 'cos(theta/2)', 'sqrt((1+cos(theta))/2)'] as const;
    expect(verdictOf(...half, { theta: { between: ['0', 'pi'] } })).toBe('agrees');
    expect(verdictOf(...half, { theta: 'real' })).toBe('differs');
  });

  it('look on both sides of a number in the text', () => {
    expect(verdictOf('scalar', '1000 - x', 'sqrt((x-1000)^2)', { x: 'real' })).toBe('differs');
    expect(verdictOf('scalar', 'x - 1/1000', 'abs(x - 1/1000)', { x: 'real' })).toBe('differs');
  });

  it('look over many turns of an angle', () => {
    for (const y of ['positive', 'real', 'nonnegative'] as const) {
      expect(verdictOf('scalar', 'sin(y)', '((sin(y))^2)^(1/2)', { y })).toBe('differs');
      expect(verdictOf('scalar', 'cos(y/2)', 'sqrt((1+cos(y))/2)', { y })).toBe('differs');
      expect(verdictOf('scalar', 'abs(sin(y))', 'sqrt(sin(y)^2)', { y })).toBe('agrees');
    }
  });

  it('never agree on decimals alone', () => {
    expect(ask('scalar', '1/sqrt(2)', '0.70710678').slips).toEqual(['rounded-decimal']);
    expect(verdictOf('scalar', 'pi', '355/113')).toBe('differs');
    const almost = ask('scalar', 'exp(pi*sqrt(163))', '262537412640768744');
    expect(almost.verdict).toBe('differs');
    expect(almost.evidence.test).toBe('high-precision witness');
    expect(almost.evidence.witness?.reference).not.toBe(almost.evidence.witness?.answer);
    expect(verdictOf('scalar', 'x', 'x + 1e-40', { x: 'real' })).toBe('differs');
  });

  it('are undefined, not wrong, where they are defined nowhere', () => {
    const nowhere = ask('scalar', 'x', '1/(x-x)', { x: 'real' });
    expect(nowhere.verdict).toBe('unreadable');
    expect(nowhere.evidence.code).toBe('division-by-zero');
  });

  it('meet assumptions and definitions, in witnesses too', () => {
    const normalised = { assume: ['abs(alpha)^2 + abs(beta)^2 = 1'] };
    const symbols = { alpha: 'complex', beta: 'complex' } as const;
    expect(verdictOf('scalar', 'abs(alpha)^2', '1 - abs(beta)^2', symbols, normalised)).toBe('agrees');
    const wrong = ask('scalar', 'abs(alpha)^2', '1 - abs(beta)', symbols, normalised);
    expect(wrong.verdict).toBe('differs');
    const square = (text: string | undefined): number => {
      const [re = 0, im = 0] =
        (text ?? '')
          .replace(/\s/g, '')
          .match(/[+-]?[\d.]+(?:e-?\d+)?/g)
          ?.map(Number) ?? [];
      return re * re + im * im;
    };
    const { values } = wrong.evidence.witness!;
    expect(square(values['alpha']) + square(values['beta'])).toBeCloseTo(1, 5);
    const omega = { definitions: { Omega: 'sqrt(Delta^2 + omega^2)' } };
    const two = { Delta: 'real', omega: 'real' } as const;
    expect(verdictOf('scalar', 'Omega^2', 'omega^2 + Delta^2', two, omega)).toBe('agrees');
    expect(verdictOf('scalar', 'Omega', 'omega + Delta', two, omega)).toBe('differs');
  });
});

describe('operators', () => {
  it('are equal entry by entry, and tell which entries differ', () => {
    expect(verdictOf('operator', 'i hbar S_z', '[S_x, S_y]')).toBe('agrees');
    const wrong = ask('operator', 'sigma_x', '[[0,1],[2,0]]');
    expect(wrong.evidence.elements).toEqual([[2, 1]]);
  });

  it('agree up to a phase only when asked', () => {
    expect(ask('operator', 'exp(-i pi sigma_z)', 'I').slips[0]).toBe('sign');
    expect(verdictOf('operator', 'exp(-i pi sigma_z)', 'I', {}, { upToPhase: true })).toBe('agrees');
    expect(verdictOf('operator', 'sigma_x', '2 sigma_x', {}, { upToPhase: true })).toBe('differs');
    expect(verdictOf('operator', 'sigma_x', 'exp(i phi) sigma_x', { phi: 'real' }, { upToPhase: true })).toBe('agrees');
  });

  it('report what they are without a change of verdict', () => {
    const { verdict, evidence } = ask(
      'operator',
      'sigma_x',
      'i sigma_x',
      {},
      { reportHermitian: true, reportUnitary: true },
    );
    expect([verdict, evidence.hermitian, evidence.unitary]).toEqual(['differs', 'no', 'yes']);
  });

  it('are not evaluated where the question is written back', () => {
    const form = { answerForm: 'evaluated' } as const;
    expect(ask('operator', '[S_x, S_y]', '[S_x, S_y]', {}, form).evidence.form).toBe('not evaluated');
    expect(ask('operator', '[S_x, S_y]', 'i hbar S_z', {}, form).evidence.form).toBe('evaluated');
    expect(ask('operator', '|+><+|', '|+><+|', {}, form).evidence.form).toBe('evaluated');
    expect(ask('scalar', '0', '<+|->', {}, form).evidence.form).toBe('not evaluated');
  });
});

describe('eigenvalues', () => {
  it('are multisets at every point, whatever the branch of a root', () => {
    expect(verdictOf('eigenvalues', '{a0 + a, a0 - a}', '{a0 + abs(a), a0 - abs(a)}', real)).toBe('agrees');
    expect(verdictOf('eigenvalues', '{a, b}', 'b, a', real)).toBe('agrees');
    expect(verdictOf('eigenvalues', '{a, a}', '{a, b}', real)).toBe('differs');
    expect(ask('eigenvalues', '{a, -a}', 'a', real).slips).toEqual(['one-eigenvalue']);
  });
});

describe('states', () => {
  it('agree by component, phase or scale', () => {
    expect(verdictOf('state', '|+y>', '(-i, 1)/sqrt(2)')).toBe('differs');
    expect(verdictOf('state', '|+y>', '(-i, 1)/sqrt(2)', {}, { upToPhase: true })).toBe('agrees');
    expect(verdictOf('state', '|+y>', '(1, i)', {}, { upToPhase: true })).toBe('differs');
    expect(verdictOf('state', '|+y>', '(1, i)', {}, { upToScale: true })).toBe('agrees');
    const strict = ask('state', '|+y>', '(1, i)', {}, { upToScale: true, requireNormalised: true });
    expect([strict.verdict, strict.slip]).toEqual(['differs', 'not-normalised']);
  });

  it('are never the zero vector', () => {
    expect(verdictOf('state', '|+>', '(0, 0)', {}, { upToScale: true })).toBe('differs');
    expect(verdictOf('state', '|+>', '(x - x, 0)', real, { upToScale: true })).toBe('differs');
  });
});

describe('eigenpairs', () => {
  it('match in either order, a degenerate pair by its span', () => {
    expect(verdictOf('eigenpairs', 'eigenpairs(sigma_x)', '-1: (1, -1); 1: (2, 2)')).toBe('agrees');
    expect(ask('eigenpairs', 'eigenpairs(sigma_x)', '1: (1, -1); -1: (1, 1)').slips).toContain('states-swapped');
    expect(verdictOf('eigenpairs', '3: |+>; 3: |->', '3: |+x>; 3: |-y>')).toBe('agrees');
    expect(verdictOf('eigenpairs', '3: |+>; 3: |->', '3: |+x>; 3: 2|+x>')).toBe('differs');
    const strict = ask('eigenpairs', 'eigenpairs(sigma_x)', '-1: (1, -1); 1: (2, 2)', {}, { requireNormalised: true });
    expect(strict.slips).toContain('not-normalised');
  });
});

describe('vectors and Pauli coefficients', () => {
  it('are compared component by component', () => {
    expect(verdictOf('vector', 'bloch(|+x>)', '(1, 0, 0)')).toBe('agrees');
    expect(ask('vector', '(a, b, 0)', '(b, a, 0)', real).slips).toContain('axes-permuted');
    expect(verdictOf('vector', '(1, 0, 0)', '(1, i, 0)')).toBe('differs');
    expect(verdictOf('pauli', 'pauli(S_x + 1)', '(1, hbar/2, 0, 0)')).toBe('agrees');
  });
});

describe('quantities', () => {
  const within = { tolerance: { relative: 0.001 } } as const;
  const quantity = (reference: string, answer: string, options = {}): ReturnType<typeof ask> =>
    ask('quantity', reference, answer, {}, options);

  it('need the dimension and the tolerance', () => {
    expect(quantity('63.87 MHz', '63870 kHz', within).verdict).toBe('agrees');
    expect(quantity('63.87 MHz', '64.0 MHz', within).verdict).toBe('differs');
    expect(quantity('63.87 MHz', '63.87', within).slips).toEqual(['wrong-unit']);
    expect(quantity('63.87 MHz', '63.87 kHz', within).slips).toEqual(['power-of-ten', 'wrong-unit']);
    expect(quantity('1 T', '1 Wb/m^2', within).verdict).toBe('agrees');
    expect(quantity('1 eV', '1.602176634e-19 J', within).verdict).toBe('agrees');
  });

  it('keep hertz and radians apart', () => {
    const turned = quantity('1 MHz', '6.2832e6 rad/s', within);
    expect([turned.verdict, turned.slip]).toEqual(['differs', 'wrong-unit']);
    expect(turned.message).toContain('rad/s');
    expect(quantity('6.2832e6 rad/s', '6.2832e6 s^-1', within).verdict).toBe('agrees');
    expect(quantity('180 deg', 'pi rad', within).verdict).toBe('agrees');
  });

  it('count typed figures where figures were asked for', () => {
    const figures = { tolerance: { significantFigures: 3 } } as const;
    expect(quantity('63.87 MHz', '63.9 MHz', figures).verdict).toBe('agrees');
    expect(quantity('63.87 MHz', '64 MHz', figures).verdict).toBe('differs');
    expect(quantity('63.87 MHz', '63.8 MHz', figures).verdict).toBe('differs');
  });
});

describe('choices', () => {
  it('are compared after trimming and case-folding', () => {
    const options = { choices: ['Up', 'Down'] };
    expect(verdictOf('choice', 'Up', ' up ', {}, options)).toBe('agrees');
    expect(verdictOf('choice', 'Up', 'down', {}, options)).toBe('differs');
    expect(verdictOf('choice', 'Up', 'sideways', {}, options)).toBe('unreadable');
  });
});

describe('ambiguous notation', () => {
  it('is a person’s to decide where the other reading agrees', () => {
    const symbols = { e: 'positive', B: 'positive', m: 'positive' } as const;
    expect(verdictOf('scalar', 'e*B*m/2', 'eB/2m', symbols)).toBe('agrees');
    const other = ask('scalar', 'e*B/(2*m)', 'eB/2m', symbols);
    expect([other.verdict, other.evidence.reason]).toEqual(['undecided', 'ambiguous notation']);
    expect(verdictOf('scalar', 'e*B/m', 'eB/2m', symbols)).toBe('differs');
  });
});

describe('real functions built from complex logarithms', () => {
  it('have the absolute values and conjugates of real numbers', () => {
    expect(verdictOf('scalar', 'abs(atan(x))', 'atan(abs(x))', real)).not.toBe('differs');
    expect(verdictOf('scalar', 'abs(atan(x))', 'atan(x)', real)).toBe('differs');
    expect(verdictOf('scalar', 'conj(sqrt(1 + atan(x)^2))', 'sqrt(1 + atan(x)^2)', real)).toBe('agrees');
    expect(verdictOf('scalar', 'cos(a)', 'cos(abs(a))', real)).toBe('agrees');
    expect(verdictOf('scalar', 'sin(abs(a) x)/abs(a)', 'sin(a x)/a', real)).toBe('agrees');
  });
});
