import { describe, expect, it } from 'vitest';
import { verdictOf } from './ask';

const symbols = {
  theta: 'real',
  phi: 'real',
  t: 'real',
  omega: 'positive',
  Delta: 'real',
  omega_1: 'positive',
  gamma: 'positive',
  B: 'real',
  T: 'positive',
  p: { between: ['0', '1'] },
} as const;

/** Hand computations and textbook results, one for each function. */
const rows: readonly (readonly [Parameters<typeof verdictOf>[0], string, string])[] = [
  ['operator', 'commutator(S_x, S_y)', 'i hbar S_z'],
  ['operator', 'anticommutator(sigma_x, sigma_x)', '2'],
  ['eigenvalues', 'eigenvalues(omega S_z)', '±hbar omega/2'],
  ['eigenpairs', 'eigenpairs(sigma_y)', '1: (1, i); -1: (1, -i)'],
  ['scalar', 'trace(I + sigma_x)', '2'],
  ['scalar', 'determinant(sigma_z)', '-1'],
  ['operator', 'adjoint(sigma_+)', 'sigma_-'],
  ['pauli', 'pauli([[1, 2], [2, 3]])', '(2, 2, 0, -1)'],
  ['scalar', 'expectation(S_x, spinor(theta, phi))', 'hbar/2 sin(theta) cos(phi)'],
  ['scalar', 'expectation(sigma_z, [[p, 0], [0, 1-p]])', '2p - 1'],
  ['scalar', 'variance(S_z, spinor(theta, phi))', 'hbar^2/4 sin^2(theta)'],
  ['scalar', 'uncertainty(S_x, |+>)', 'hbar/2'],
  ['scalar', 'probability(|+x>, |+>)', '1/2'],
  ['scalar', 'probability(|+>, [[p, 0], [0, 1-p]])', 'p'],
  ['operator', 'projector((1, 1))', '(I + sigma_x)/2'],
  ['operator', 'density(|->)', '[[0,0],[0,1]]'],
  ['vector', 'bloch(spinor(theta, phi))', '(sin(theta) cos(phi), sin(theta) sin(phi), cos(theta))'],
  ['scalar', 'purity([[p, 0], [0, 1-p]])', 'p^2 + (1-p)^2'],
  ['scalar', 'entropy(I/2)', 'ln 2'],
  ['scalar', 'entropy(|+><+|)', '0'],
  ['scalar', 'entropy([[p, 0], [0, 1-p]])', '-p ln p - (1-p) ln(1-p)'],
  ['state', 'spinor(pi/2, 0)', '|+x>'],
  ['operator', 'rotation((0, 0, 1), theta)', 'cos(theta/2) - i sin(theta/2) sigma_z'],
  ['operator', 'rotation((0, 1, 0), 2 pi)', '-1'],
  ['operator', 'propagator(omega S_x, t)', 'cos(omega t/2) - i sigma_x sin(omega t/2)'],
  ['state', 'evolve(omega S_x, t, |+>)', '(cos(omega t/2), -i sin(omega t/2))'],
  ['operator', 'heisenberg(S_x, omega S_z, t)', 'S_x cos(omega t) - S_y sin(omega t)'],
  ['operator', 'larmor(gamma, (0, 0, B))', '-gamma B S_z'],
  ['scalar', 'rabi(omega_1, 0, t)', '(1 - cos(omega_1 t))/2'],
  ['operator', 'thermal(hbar omega/2 sigma_z, T)', '(1 - tanh(hbar omega/(2 T)) sigma_z)/2'],
];

describe('reference functions', () => {
  it.each(rows)('%s %s is %s', (kind, reference, answer) => {
    expect(verdictOf(kind, reference, answer, symbols)).toBe('agrees');
  });
});
