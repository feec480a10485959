import Link from 'next/link';
import { paths } from '@/lib/paths';
import { type BenchInput } from './bench-input';

type Example = Pick<BenchInput, 'kind' | 'reference' | 'answer'> & { what: string; symbols?: string };

const examples: readonly Example[] = [
  { what: 'A commutator left standing', kind: 'operator', reference: 'i*hbar*S_z', answer: '[S_x, S_y]' },
  { what: 'A lost sign', kind: 'operator', reference: 'i hbar S_z', answer: '-i hbar S_z' },
  { what: 'One wrong matrix element', kind: 'operator', reference: 'sigma_x', answer: '[[0, 1], [-1, 0]]' },
  {
    what: 'A root that needs a sign',
    kind: 'scalar',
    reference: 'x',
    answer: 'sqrt(x^2)',
    symbols: 'x',
  },
  {
    what: 'Levels in one line',
    kind: 'eigenvalues',
    reference: '{hbar omega/2, -hbar omega/2}',
    answer: '±ħω/2',
    symbols: 'omega positive',
  },
  { what: 'A state with a slip of i', kind: 'state', reference: '|+y>', answer: '(1, -i)/sqrt(2)' },
  { what: 'Two ways to read it', kind: 'scalar', reference: 'e B/(2 m)', answer: 'eB/2m', symbols: 'e, B, m positive' },
];

/** Pairs to start from; each is a link to the bench with its fields filled in. */
export function Examples() {
  return (
    <ul className="grid gap-1.5 text-small">
      {examples.map(({ what, ...input }) => (
        <li key={what}>
          <Link href={`${paths.bench()}?${new URLSearchParams(input).toString()}`}>{what}</Link>
        </li>
      ))}
    </ul>
  );
}
