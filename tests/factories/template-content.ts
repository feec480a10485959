import { templateContentSchema, type TemplateContent } from '@/lib/templates/content';

/** A small template of three parts (an operator, eigenvalues, a scalar) over an integer and a choice. */
export function templateContent(overrides: Partial<TemplateContent> = {}): TemplateContent {
  return templateContentSchema.parse({
    title: 'A spin in a field',
    prompt: 'A spin-½ has $H = n\\,\\omega A$ with n = {{n}} and A = {{A}}.',
    parameters: [
      { type: 'integer', name: 'n', from: 1, to: 9 },
      { type: 'choice', name: 'A', values: ['S_x', 'S_y', 'S_z'] },
    ],
    symbols: [{ name: 'omega', domain: 'positive' }],
    parts: [
      {
        key: 'a',
        prompt: 'Find $[A, S_x + S_y]$.',
        kind: 'operator',
        reference: 'commutator(A, S_x + S_y)',
        slips: [{ slip: 'sign', share: 500 }],
      },
      { key: 'b', prompt: 'Find the energies.', kind: 'eigenvalues', reference: 'eigenvalues(n omega A)' },
      {
        key: 'c',
        prompt: 'Find $\\langle H \\rangle$ in $|+\\rangle$.',
        kind: 'scalar',
        reference: 'expectation(n omega A, |+>)',
      },
    ],
    ...overrides,
  });
}
