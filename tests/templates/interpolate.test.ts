import { describe, expect, it } from 'vitest';
import { interpolate, slotsIn, typesetValue } from '@/lib/templates/interpolate';

const omega = { symbols: [{ name: 'omega', domain: 'positive' as const }] };

describe('interpolate', () => {
  it.each([
    // text, values, expected
    ['with n = {{n}}.', { n: '-3' }, 'with n = $-3$.'],
    ['$H = {{n}}\\hbar\\omega$', { n: '-1' }, '$H = -\\hbar\\omega$'],
    ['$$a + {{n}} b$$ and {{n}}', { n: '-3' }, '$$a - 3 b$$ and $-3$'],
    ['\\$5 for {{n}} spins', { n: '2' }, '\\$5 for $2$ spins'],
    ['$x$ {{n}} $y$', { n: '2' }, '$x$ $2$ $y$'],
    ['{{ n }}', { n: '7' }, '$7$'],
    ['$a + {{n}}$, ${{n}} b + c$', { n: '0' }, '$a$, $c$'],
    ['${{n}} b$', { n: '1' }, '$b$'],
    ['costs $5 for {{n}} and $6', { n: '2' }, 'costs $5 for $2$ and $6'],
    ['no names here', { n: '7' }, 'no names here'],
    ['{{m}}', { n: '7' }, '{{m}}'],
    ['{{constructor}} {{toString}}', { n: '7' }, '{{constructor}} {{toString}}'],
  ])('sets %j with %j', (text, values, expected) => {
    expect(interpolate(text, values as Record<string, string>)).toBe(expected);
  });

  it('sets operators, states and fractions as TeX', () => {
    expect(interpolate('{{A}}', { A: 'S_x' })).toMatch(/^\$.*S_.*x.*\$$/);
    expect(interpolate('{{s}}', { s: '|+>' })).toMatch(/rangle/);
    expect(interpolate('${{q}}\\hbar$', { q: '-1/2' })).toMatch(/^\$-\\frac\{1\}\{2\}\s*\\hbar\$$/);
  });

  it('knows the symbols of the template in a value', () => {
    expect(interpolate('{{E}}', { E: 'omega/2' }, omega)).toContain('\\omega');
  });

  it('never lets a value that cannot be read become TeX', () => {
    expect(interpolate('${{x}}$', { x: '\\href{javascript:1}{x} $ $' })).not.toMatch(/\\href|\$.*\$.*\$/);
  });
});

describe('typesetValue', () => {
  it.each([
    ['1', { isOne: true, isZero: false, negative: false, isSum: false }],
    ['-1', { isOne: true, isZero: false, negative: true, isSum: false }],
    ['(-3)', { isOne: false, isZero: false, negative: true, isSum: false }],
    ['0', { isOne: false, isZero: true, negative: false, isSum: false }],
    ['0.0', { isOne: false, isZero: true, negative: false, isSum: false }],
    ['1 - 2', { isOne: false, isZero: false, negative: false, isSum: true }],
    ['-1/2', { isOne: false, isZero: false, negative: true, isSum: false }],
  ])('knows what %s is', (text, facts) => {
    expect(typesetValue(text)).toMatchObject(facts);
  });
});

describe('slotsIn', () => {
  it('finds names between double braces, in formulas, too', () => {
    expect(slotsIn('{{n}} and $x^{{{m}}}$ {{ two words }}').map((slot) => slot.name)).toEqual(['n', 'm', 'two words']);
  });
});
