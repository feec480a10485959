import { templateContentSchema, type TemplateContent } from '@/lib/templates/content';

/** A question of the demo: what its template says, and the shelf's words for it. */
export type DemoTemplate = { id: DemoTemplateId; topics: string[]; content: TemplateContent };

export type DemoTemplateId = 'commutators' | 'magnet' | 'precession';

/** The fields used in the magnet question, with their three coefficients; each has length 3. */
export const magnetFields = [
  { text: '2 sigma_x - sigma_y + 2 sigma_z', coefficients: [2, -1, 2] },
  { text: 'sigma_x + 2 sigma_y - 2 sigma_z', coefficients: [1, 2, -2] },
  { text: '-2 sigma_x + 2 sigma_y + sigma_z', coefficients: [-2, 2, 1] },
  { text: '2 sigma_x + sigma_y - 2 sigma_z', coefficients: [2, 1, -2] },
] as const;

/** The three questions from which the demo's sets are made. */
export const demoTemplates: readonly DemoTemplate[] = [
  {
    id: 'commutators',
    topics: ['spin algebra', 'commutators'],
    content: templateContentSchema.parse({
      title: 'Products of spin operators',
      prompt:
        'For a particle of spin $\\tfrac12$ let $A = {{A}}$ and $B = S_x + S_y + S_z$, where $S_k = \\tfrac{\\hbar}{2}\\sigma_k$.',
      solution: 'Use $[S_x, S_y] = \\mathrm{i}\\hbar S_z$ and its cyclic partners; $S_k^2 = \\hbar^2/4$ for each $k$.',
      parameters: [
        { type: 'integer', name: 'n', from: 2, to: 6 },
        { type: 'choice', name: 'A', values: ['S_x', 'S_y', 'S_z'] },
      ],
      parts: [
        {
          key: 'a',
          prompt: 'Work out the commutator of ${{n}} A$ with $B$.',
          kind: 'operator',
          reference: 'commutator(n*A, S_x + S_y + S_z)',
          weight: 3,
          slips: [
            { slip: 'sign', share: 500 },
            { slip: 'commutator-order', share: 500 },
            { slip: 'conjugated', share: 500 },
            { slip: 'hbar-power', share: 500 },
          ],
        },
        {
          key: 'b',
          prompt: 'Work out the anticommutator of $A$ with ${{n}} A$.',
          kind: 'operator',
          reference: 'anticommutator(A, n*A)',
          weight: 2,
          slips: [
            { slip: 'factor-half', share: 500 },
            { slip: 'hbar-power', share: 500 },
          ],
        },
        {
          key: 'c',
          prompt: 'What is the expectation value of ${{n}} A^2$ in any state?',
          kind: 'scalar',
          reference: 'expectation(n*A*A, |+x>)',
          weight: 2,
          slips: [{ slip: 'factor-two', share: 500 }],
        },
      ],
    }),
  },
  {
    id: 'magnet',
    topics: ['energies', 'Hamiltonian as a matrix'],
    content: templateContentSchema.parse({
      title: 'A tilted magnet',
      prompt:
        'A spin sits in the field of a tilted magnet, with $H = \\tfrac{{{n}}\\hbar\\Omega}{2}\\,\\bigl({{F}}\\bigr)$ and $\\Omega > 0$.',
      solution: '$(\\vec a\\cdot\\vec\\sigma)^2 = |\\vec a|^2$, and every field here has length 3.',
      parameters: [
        { type: 'integer', name: 'n', from: 1, to: 5 },
        { type: 'choice', name: 'F', values: magnetFields.map(({ text }) => text) },
      ],
      symbols: [{ name: 'Omega', domain: 'positive' }],
      parts: [
        {
          key: 'a',
          prompt: 'Find the energies.',
          kind: 'eigenvalues',
          reference: 'eigenvalues(n*hbar*Omega/2*F)',
          weight: 3,
          slips: [
            { slip: 'factor-two', share: 500 },
            { slip: 'one-eigenvalue', share: 500 },
          ],
        },
        {
          key: 'b',
          prompt: 'Write $H$ as a matrix in the $z$ basis.',
          kind: 'operator',
          reference: 'n*hbar*Omega/2*F',
          weight: 4,
          slips: [
            { slip: 'conjugated', share: 750 },
            { slip: 'transposed', share: 750 },
            { slip: 'factor-two', share: 500 },
          ],
        },
        {
          key: 'c',
          prompt: 'The spin points along $+z$. Find the expectation value of $H$.',
          kind: 'scalar',
          reference: 'expectation(n*hbar*Omega/2*F, |+>)',
          weight: 3,
          slips: [{ slip: 'sign', share: 500 }],
        },
      ],
    }),
  },
  {
    id: 'precession',
    topics: ['evolution', 'precession'],
    content: templateContentSchema.parse({
      title: 'Precession about z',
      prompt:
        'At $t = 0$ a spin points along $+x$. It then moves under $H = \\tfrac{{{n}}\\hbar\\omega}{2}\\,\\sigma_z$ with $\\omega > 0$.',
      solution: 'Each component turns with its own energy: $\\mathrm{e}^{\\mp\\mathrm{i}{{n}}\\omega t/2}/\\sqrt2$.',
      parameters: [{ type: 'integer', name: 'n', from: 1, to: 6 }],
      symbols: [
        { name: 'omega', domain: 'positive' },
        { name: 't', domain: 'real' },
      ],
      parts: [
        {
          key: 'a',
          prompt: 'Write the state at time $t$ in the $z$ basis (an overall phase does not matter).',
          kind: 'state',
          reference: 'evolve(n*hbar*omega/2*sigma_z, t, |+x>)',
          options: { upToPhase: true, requireNormalised: true },
          weight: 4,
          slips: [
            { slip: 'not-normalised', share: 750 },
            { slip: 'conjugated', share: 500 },
          ],
        },
        {
          key: 'b',
          prompt: 'Find the probability that the spin points along $+x$ at time $t$.',
          kind: 'scalar',
          reference: 'probability(|+x>, evolve(n*hbar*omega/2*sigma_z, t, |+x>))',
          weight: 3,
          slips: [
            { slip: 'sine-cosine', share: 250 },
            { slip: 'double-angle', share: 500 },
          ],
        },
        {
          key: 'c',
          prompt: 'Find the expectation value of $S_x$ at time $t$.',
          kind: 'scalar',
          reference: 'expectation(S_x, evolve(n*hbar*omega/2*sigma_z, t, |+x>))',
          weight: 3,
          slips: [
            { slip: 'factor-two', share: 500 },
            { slip: 'half-angle', share: 500 },
          ],
        },
      ],
    }),
  },
];
