import { Button } from '@/components/ui/button';
import { type AnswerKind } from '@/lib/checker/contract';

export interface Example {
  readonly text: string;
  readonly kind: AnswerKind;
  readonly symbols: string;
}

interface Line {
  readonly what: string;
  readonly kind: AnswerKind;
  readonly symbols: string;
  readonly spellings: readonly string[];
}

const lines: readonly Line[] = [
  {
    what: 'Greek letters, ħ',
    kind: 'scalar',
    symbols: 'omega, t',
    spellings: ['hbar omega t', 'ħωt', '\\hbar\\omega t'],
  },
  {
    what: 'fractions',
    kind: 'scalar',
    symbols: 'omega',
    spellings: ['hbar omega/2', '½ħω', '\\frac{\\hbar\\omega}{2}'],
  },
  {
    what: 'roots and powers',
    kind: 'scalar',
    symbols: 'a, b',
    spellings: ['sqrt(a^2 + b^2)', '√(a²+b²)', '\\sqrt{a^2+b^2}'],
  },
  {
    what: 'functions',
    kind: 'scalar',
    symbols: 'theta',
    spellings: ['sin(theta/2)^2', 'sin²(θ/2)', '\\sin^2\\frac{\\theta}{2}'],
  },
  { what: 'indices', kind: 'scalar', symbols: 'omega_1', spellings: ['omega_1', 'ω₁', '\\omega_{1}'] },
  {
    what: 'Pauli and spin operators',
    kind: 'operator',
    symbols: '',
    spellings: ['sigma_x + i S_y', 'σx + iSy', '\\hat\\sigma_x + i\\hat{S}_y'],
  },
  {
    what: 'matrices',
    kind: 'operator',
    symbols: 'a',
    spellings: ['[[a, 0], [0, -a]]', '[a, 0; 0, -a]', '\\begin{pmatrix} a & 0 \\\\ 0 & -a \\end{pmatrix}'],
  },
  {
    what: 'kets and components',
    kind: 'state',
    symbols: '',
    spellings: ['(|+> + i|->)/sqrt2', '(1, i)/√2', '\\frac{1}{\\sqrt2}(\\ket{\\uparrow} + i\\ket{\\downarrow})'],
  },
  { what: 'plus and minus', kind: 'eigenvalues', symbols: 'a, b', spellings: ['a +- b', 'a ± b', '\\{a+b, a-b\\}'] },
  { what: 'units', kind: 'quantity', symbols: '', spellings: ['2.4e-4 eV', '63.8 MHz', '1.5×10^-3 rad/s'] },
];

/** What can be written and how, in each of the three spellings; pressing one puts it into the field. */
export function Spellings({ onTry }: { onTry: (example: Example) => void }) {
  return (
    <div className="grid gap-3">
      {lines.map(({ what, kind, symbols, spellings }) => (
        <div key={what} className="grid gap-x-6 gap-y-0.5 sm:grid-cols-[12rem_1fr]">
          <p className="text-small text-grey">{what}</p>
          <p className="flex flex-wrap gap-x-6 gap-y-1">
            {spellings.map((text) => (
              <Button key={text} look="plain" className="text-start" onClick={() => onTry({ text, kind, symbols })}>
                <code className="break-all">{text}</code>
              </Button>
            ))}
          </p>
        </div>
      ))}
    </div>
  );
}
