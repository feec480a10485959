import { describe, expect, it } from 'vitest';
import { matrixElements } from '@/lib/presenters/matrix-elements';

describe('taking a typeset matrix apart', () => {
  it('gives each element, and what stands before and behind', () => {
    expect(matrixElements('\\frac{\\hbar}{2}\\begin{pmatrix}2 & 1 - i\\\\ \\frac{a}{b} & -2\\end{pmatrix}t')).toEqual({
      before: '\\frac{\\hbar}{2}',
      rows: [
        ['2', '1 - i'],
        ['\\frac{a}{b}', '-2'],
      ],
      behind: 't',
    });
  });

  it('does not cut inside braces', () => {
    expect(matrixElements('\\begin{pmatrix}\\text{a & b}\\\\ \\sqrt{2 \\\\ 3}\\end{pmatrix}')?.rows).toEqual([
      ['\\text{a & b}'],
      ['\\sqrt{2 \\\\ 3}'],
    ]);
  });

  it('leaves alone what is no one matrix', () => {
    expect(matrixElements('a + b')).toBeNull();
    expect(matrixElements('\\begin{pmatrix}a & b\\\\ c\\end{pmatrix}')).toBeNull();
    expect(matrixElements('\\begin{pmatrix}a\\end{pmatrix}\\begin{pmatrix}b\\end{pmatrix}')).toBeNull();
  });
});
