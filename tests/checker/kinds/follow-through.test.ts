import { describe, expect, it } from 'vitest';
import { checkFollowThrough, compute } from '@/lib/checker/index';
import { type CheckRequest } from '@/lib/checker/contract';

const later: CheckRequest = { id: 'b', kind: 'eigenvalues', reference: 'eigenvalues(partA)', answer: '±2 hbar' };

describe('follow-through', () => {
  it('checks against what follows from the student’s own answer', () => {
    const own = checkFollowThrough(later, [{ name: 'partA', kind: 'operator', answer: '2ħ σ_x' }]);
    expect(own.outcome).toMatchObject({ verdict: 'agrees' });
    expect(own.degenerate).toBe(false);
    const other = checkFollowThrough(later, [{ name: 'partA', kind: 'operator', answer: 'ħ σ_x' }]);
    expect(other.outcome).toMatchObject({ verdict: 'differs', slip: 'factor-two' });
  });

  it('says where the student’s own value leaves nothing to work out', () => {
    const trivial = checkFollowThrough({ ...later, answer: '{hbar, hbar}' }, [
      { name: 'partA', kind: 'operator', answer: 'hbar I' },
    ]);
    expect(trivial.degenerate).toBe(true);
  });

  it('is an error where the earlier answer cannot stand in the reference', () => {
    const unreadable = checkFollowThrough(later, [{ name: 'partA', kind: 'operator', answer: 'sigma_' }]);
    expect(unreadable.outcome).toHaveProperty('error');
  });
});

describe('a computed reference', () => {
  const text = (kind: CheckRequest['kind'], reference: string, symbols = {}): string => {
    const computed = compute({ kind, reference, symbols });
    return computed.ok ? computed.text : computed.error;
  };

  it('is worked out and written shortly', () => {
    const angles = { theta: 'real', phi: 'real' };
    expect(text('scalar', 'expectation(S_x, spinor(theta, phi))', angles)).toBe('(hbar*sin(theta)*cos(phi))/2');
    expect(text('eigenvalues', 'eigenvalues(hbar*(3 sigma_z + 4 sigma_x))')).toBe('{5*hbar, -5*hbar}');
    expect(text('operator', 'commutator(sigma_x, sigma_y)')).toBe('[[2*i, 0], [0, -2*i]]');
    expect(text('eigenpairs', 'eigenpairs(S_y)')).toBe('hbar/2: [[1], [i]]; -hbar/2: [[1], [-i]]');
  });

  it('tells its author what is wrong', () => {
    expect(text('scalar', 'expectation(S_z, (1, 1))')).toContain('not normalised');
    expect(text('scalar', 'foo')).toContain('foo');
  });
});
