import { describe, expect, it } from 'vitest';
import { type AnswerKind } from '@/lib/checker/contract';
import { type AnswerTree } from '@/lib/checker/notation/answer-tree';
import { parse } from '@/lib/checker/notation/parse';
import { structureOf } from '@/lib/checker/notation/structure';
import { printAnswer } from '@/lib/templates/print-expression';

const symbols = { omega: 'positive', theta: 'real', phi: 'real', a_0: 'real', x: 'real', t: 'real' } as const;

function read(text: string, kind: AnswerKind): AnswerTree {
  const { tree, diagnostics } = parse(text, { kind, symbols, allowReferenceFunctions: true });
  if (tree === null) throw new Error(`${text}: ${diagnostics.map((diagnostic) => diagnostic.message).join(' ')}`);
  return tree;
}

describe('printAnswer', () => {
  it.each<[AnswerKind, string]>([
    ['scalar', '2ħω'],
    ['scalar', 'hbar omega/2 x'],
    ['scalar', '-x^2 + 3/4'],
    ['scalar', '1/(x + 1)/2'],
    ['scalar', 'x^-2^x'],
    ['scalar', '(-3)^2'],
    ['scalar', '1e-3 x + 2×10^-3 + 0.50'],
    ['scalar', 'sin²θ cos φ/2'],
    ['scalar', 'sin^-1 x + atan2(x, t)'],
    ['scalar', '\\frac{\\sqrt{1+x^2}}{2} - \\sqrt[3]{x}'],
    ['scalar', '|x - 1| + |sin θ|'],
    ['scalar', 'e^{iφ} + exp(-i omega t) + conj(x) + x^*'],
    ['scalar', 'hbar omega + pi + a0'],
    ['scalar', '<+|S_x|->'],
    ['scalar', '|<+x|+>|^2'],
    ['scalar', '½ x'],
    ['scalar', 'Re(e^{iφ}) - Im(x) + ln x'],
    ['scalar', 'expectation(omega S_z, |+>)'],
    ['scalar', 'trace(sigma_x sigma_y) + determinant([[1, x], [x, 1]])'],
    ['operator', 'i hbar S_z'],
    ['operator', 'S_+ S_- + S_- S_+'],
    ['operator', 'commutator(S_x, S_y + S_z)'],
    ['operator', '\\frac{\\hbar}{2}\\begin{pmatrix}1&0\\\\0&-1\\end{pmatrix}'],
    ['operator', '|+><-| + I/2'],
    ['operator', 'exp(-i theta sigma_x/2)'],
    ['operator', '(S_x S_y)^† + (S_x)^T + S_z^2 + S_x^-1'],
    ['operator', 'projector(|+x>)'],
    ['pauli', '(1, x, -x, 0)'],
    ['vector', '[1, 2, x]'],
    ['state', '(|+> + i|->)/sqrt 2'],
    ['state', '[cos(theta/2), e^{iφ} sin(theta/2)]'],
    ['state', '[x; 1]'],
    ['state', '|-x>'],
    ['eigenvalues', '{hbar omega/2, -hbar omega/2}'],
    ['eigenvalues', '±ħω/2'],
    ['eigenvalues', 'x ± 1'],
    ['eigenvalues', 'E_+ = x, E_- = -x'],
    ['eigenvalues', 'eigenvalues(omega S_x)'],
    ['eigenpairs', '1: |+>; -1: |->'],
    ['quantity', '63.87 MHz'],
    ['quantity', '3*21.29 MHz'],
    ['quantity', '2×10^-3 m s^-1'],
    ['quantity', '-3/2 kg/s^2'],
  ])('as %s: what is printed of %s reads to the same', (kind, text) => {
    const tree = read(text, kind);
    const printed = printAnswer(tree);
    expect(structureOf(read(printed, kind)), printed).toBe(structureOf(tree));
    expect(printAnswer(read(printed, kind)), 'printing again').toBe(printed);
  });

  it.each<[AnswerKind, string, string]>([
    // Letters that may be declared as names of something else, and brackets that could be a list.
    ['scalar', 'h omega', '(2*pi*hbar)*omega'],
    ['operator', '[S_x, S_y] + {S_x, S_y}', 'commutator(S_x, S_y) + anticommutator(S_x, S_y)'],
  ])('as %s: %s is printed by its meaning as %s', (kind, text, printed) => {
    expect(printAnswer(read(text, kind))).toBe(printed);
    expect(printAnswer(read(printed, kind))).toBe(printed);
  });
});
