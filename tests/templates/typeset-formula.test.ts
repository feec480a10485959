import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { typesetFormula } from '@/lib/templates/typeset-formula';
import { type TypesetValue } from '@/lib/templates/typeset-value';

function number(value: number): TypesetValue {
  const magnitude = String(Math.abs(value));
  return {
    latex: String(value),
    negative: value < 0,
    magnitude,
    isOne: Math.abs(value) === 1,
    isZero: value === 0,
    isSum: false,
  };
}

const sum: TypesetValue = {
  latex: 'a - b',
  negative: false,
  magnitude: 'a - b',
  isOne: false,
  isZero: false,
  isSum: true,
};
const half: TypesetValue = {
  latex: '-\\frac{1}{2}',
  negative: true,
  magnitude: '\\frac{1}{2}',
  isOne: false,
  isZero: false,
  isSum: false,
};
const sigma: TypesetValue = { ...number(2), latex: '\\sigma_x', magnitude: '\\sigma_x' };

const set = (formula: string, values: Record<string, TypesetValue>) => typesetFormula(formula, (name) => values[name]);
const withN = (formula: string, n: number) => set(formula, { n: number(n) });

describe('typesetFormula', () => {
  it.each([
    // formula, value of n, expected
    ['{{n}}', -3, '-3'],
    ['H = {{n}}\\hbar\\omega', 3, 'H = 3\\hbar\\omega'],
    ['H = {{n}}\\hbar\\omega', -3, 'H = -3\\hbar\\omega'],
    ['H = {{n}}\\hbar\\omega', 1, 'H = \\hbar\\omega'],
    ['H = {{n}}\\hbar\\omega', -1, 'H = -\\hbar\\omega'],
    ['H = {{n}}\\hbar\\omega', 0, 'H = 0'],
    ['a + {{n}} b', -3, 'a - 3 b'],
    ['a - {{n}} b', -3, 'a + 3 b'],
    ['a - {{n}} b', 1, 'a - b'],
    ['a + {{n}} b - c', 0, 'a - c'],
    ['{{n}} b + c', 0, 'c'],
    ['{{n}} b - c', 0, '- c'],
    ['-{{n}} b', -2, '2 b'],
    ['-{{n}} b', 2, '-2 b'],
    ['n = {{n}}', 0, 'n = 0'],
    ['n = {{n}}', 1, 'n = 1'],
    ['a + {{n}}', 0, 'a '],
    ['\\hbar {{n}}', -3, '\\hbar \\left(-3\\right)'],
    ['\\hbar {{n}}', 3, '\\hbar \\cdot 3'],
    ['\\hbar {{n}} b', 1, '\\hbar  b'],
    ['2{{n}}', 5, '2\\cdot 5'],
    ['{{n}}2', 5, '5\\cdot 2'],
    ['2 \\cdot {{n}}', -5, '2 \\cdot \\left(-5\\right)'],
    ['{{n}} \\cdot x', 1, 'x'],
    ['x^{{n}}', -3, 'x^{-3}'],
    ['x^{ {{n}} }', -3, 'x^{ -3 }'],
    ['x_{{n}}', 1, 'x_{1}'],
    ['{{n}}^2', -3, '\\left(-3\\right)^2'],
    ['{{n}}^2', 3, '3^2'],
    ['{{n}}/2', -3, '-3/2'],
    ['a/{{n}}', -3, 'a/\\left(-3\\right)'],
    ['\\frac{{n}}{2}', -3, '\\frac{-3}{2}'],
    ['\\frac{a}{{n}}', 2, '\\frac{a}{2}'],
    ['\\frac{{{n}}a}{2}', 1, '\\frac{a}{2}'],
    ['\\sqrt{{n}}', 2, '\\sqrt{2}'],
    ['\\sin {{n}}\\theta', -2, '\\sin \\left(-2\\theta\\right)'],
    ['\\sin {{n}}\\theta', -1, '\\sin \\left(-\\theta\\right)'],
    ['\\sin({{n}}\\theta)', -1, '\\sin(-\\theta)'],
    ['{{n}}\\sin\\theta', 1, '\\sin\\theta'],
    ['B = {{n}}\\,\\mathrm{T}', 1, 'B = 1\\,\\mathrm{T}'],
    ['B = {{n}}\\,\\mathrm{T}', 0, 'B = 0\\,\\mathrm{T}'],
    ['{{n}}\\,\\mathrm{i}', 1, '\\mathrm{i}'],
    ['({{n}}, 1, {{n}})', -2, '(-2, 1, -2)'],
    [
      '\\begin{pmatrix} {{n}} & a + {{n}}b \\\\ 0 & {{n}} \\end{pmatrix}',
      -1,
      '\\begin{pmatrix} -1 & a - b \\\\ 0 & -1 \\end{pmatrix}',
    ],
    ['{{n}}|+\\rangle - {{n}}|-\\rangle', -1, '-|+\\rangle + |-\\rangle'],
    ['{{n}}|+\\rangle + |-\\rangle', 0, '|-\\rangle'],
    ['|{{n}}|', -1, '|-1|'],
    ['{{n}} S_+ + S_-', 1, 'S_+ + S_-'],
    ['\\left({{n}} - x\\right)', -1, '\\left(-1 - x\\right)'],
    ['a \\le {{n}}', -1, 'a \\le -1'],
  ])('sets %s with n = %d as %s', (formula, n, expected) => {
    expect(withN(formula, n)).toBe(expected);
  });

  it('brackets a sum beside a factor and leaves it alone by itself', () => {
    expect(set('{{s}} \\sigma_z', { s: sum })).toBe('\\left(a - b\\right) \\sigma_z');
    expect(set('\\tfrac12\\,\\bigl({{s}}\\bigr)', { s: sum })).toBe('\\tfrac12\\,\\bigl(a - b\\bigr)');
    expect(set('x - {{s}}', { s: sum })).toBe('x - \\left(a - b\\right)');
    expect(set('x = {{s}}', { s: sum })).toBe('x = a - b');
  });

  it('merges the sign of a fraction', () => {
    expect(set('a + {{h}}\\hbar', { h: half })).toBe('a - \\frac{1}{2}\\hbar');
    expect(set('{{h}}^2', { h: half })).toBe('\\left(-\\frac{1}{2}\\right)^2');
    expect(set('2{{h}}', { h: { ...half, negative: false, latex: half.magnitude } })).toBe('2\\cdot \\frac{1}{2}');
  });

  it('sets operators like letters', () => {
    expect(set('[{{A}}, S_y]', { A: sigma })).toBe('[\\sigma_x, S_y]');
  });

  it('leaves a name without a value as it stands', () => {
    expect(set('a + {{m}} b', {})).toBe('a + {{m}} b');
  });

  it('keeps a command apart from the letter that comes to stand beside it', () => {
    expect(withN('\\hbar{{n}}b', 1)).toBe('\\hbar b');
    expect(set('{{A}}x', { A: { ...sigma, magnitude: '\\omega', latex: '\\omega' } })).toBe('\\omega x');
  });

  it('gives a formula without drawn values back unchanged', () => {
    const pieces = fc.constantFrom(...'ab2{}()[]^_+-&|\\ =/,', '\\frac', '\\left', '\\right', '\\sin', '{{n}}');
    fc.assert(
      fc.property(fc.array(pieces, { maxLength: 40 }), (parts) => {
        const formula = parts.join('');
        return typesetFormula(formula, () => undefined) === formula;
      }),
    );
  });
});
