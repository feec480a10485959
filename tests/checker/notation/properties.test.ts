import fc from 'fast-check';
import katex from 'katex';
import { describe, expect, it } from 'vitest';
import { type AnswerKind, type Symbols } from '@/lib/checker/notation/answer-tree';
import { parse } from '@/lib/checker/notation/parse';
import { printLatex } from '@/lib/checker/notation/print-latex';
import { printPlain } from '@/lib/checker/notation/print-plain';
import { structureOf } from '@/lib/checker/notation/structure';
import { read } from '@/lib/checker/reader';

const symbols: Symbols = {
  a: 'real',
  b: 'complex',
  x: 'real',
  n: 'integer',
  omega: 'positive',
  theta: 'real',
  omega_1: 'positive',
  k_B: 'positive',
  a_0: 'real',
  "x'": 'real',
};

/** A text in plain spelling, the same in free spelling, and the structure that both must have. */
interface Written {
  readonly plain: string;
  readonly free: string;
  readonly structure: string;
}

const atoms: fc.Arbitrary<Written> = fc.oneof(
  fc
    .constantFrom(
      { plain: 'omega', free: 'ω', structure: "'omega" },
      { plain: 'omega', free: '\\omega{}', structure: "'omega" },
      { plain: 'omega_1', free: '\\omega_{1}', structure: "'omega_1" },
      { plain: 'omega_1', free: 'ω₁', structure: "'omega_1" },
      { plain: 'a_0', free: 'a0', structure: "'a_0" },
      { plain: "x'", free: 'x^\\prime', structure: "'x'" },
      { plain: 'k_B', free: 'k_{\\mathrm{B}}', structure: "'k_B" },
      { plain: 'theta', free: '\\vartheta', structure: "'theta" },
      { plain: 'hbar', free: 'ħ', structure: 'hbar' },
      { plain: 'pi', free: 'π', structure: 'pi' },
      { plain: 'i', free: '\\mathrm{i}', structure: 'i' },
      { plain: 'a', free: ' a ', structure: "'a" },
    )
    .map((written) => ({ ...written, free: written.free.replace('{}', ' ') })),
  fc.integer({ min: 1, max: 99 }).map((value) => {
    const text = String(value);
    return { plain: text, free: text, structure: value % 10 === 0 ? `${value / 10}e1` : text };
  }),
);

/** Scalars built from the grammar, each spelled twice. Every operand is bracketed, so that nothing is in doubt. */
const scalars: fc.Arbitrary<Written> = fc.letrec<{ scalar: Written }>((tie) => {
  const scalar = tie('scalar');
  const both = fc.tuple(scalar, scalar);
  return {
    scalar: fc.oneof(
      { maxDepth: 4, withCrossShrink: true },
      atoms,
      both.map(([one, other]) => ({
        plain: `((${one.plain}) + (${other.plain}))`,
        free: `\\left(${one.free} + {${other.free}}\\right)`,
        structure: `(sum + ${one.structure} + ${other.structure})`,
      })),
      both.map(([one, other]) => ({
        plain: `((${one.plain}) - (${other.plain}))`,
        free: `(${one.free} − (${other.free}))`,
        structure: `(sum + ${one.structure} - ${other.structure})`,
      })),
      both.map(([one, other]) => ({
        plain: `((${one.plain})*(${other.plain}))`,
        free: `((${one.free})(${other.free}))`,
        structure: `(* ${one.structure} ${other.structure})`,
      })),
      both.map(([one, other]) => ({
        plain: `((${one.plain})/(${other.plain}))`,
        free: `\\frac{${one.free}}{${other.free}}`,
        structure: `(/ ${one.structure} ${other.structure})`,
      })),
      both.map(([one, other]) => ({
        plain: `((${one.plain})^(${other.plain}))`,
        free: `{(${one.free})^{${other.free}}}`,
        structure: `(^ ${one.structure} ${other.structure})`,
      })),
      scalar.map((one) => ({
        plain: `(-(${one.plain}))`,
        free: `(−(${one.free}))`,
        structure: `(sum - ${one.structure})`,
      })),
      scalar.map((one) => ({
        plain: `sqrt(${one.plain})`,
        free: `\\sqrt{${one.free}}`,
        structure: `(root2 ${one.structure})`,
      })),
      scalar.map((one) => ({
        plain: `exp(${one.plain})`,
        free: `e^{${one.free}}`,
        structure: `(exp ${one.structure})`,
      })),
      scalar.map((one) => ({
        plain: `cos(${one.plain})`,
        free: `\\cos\\left(${one.free}\\right)`,
        structure: `(cos ${one.structure})`,
      })),
      scalar.map((one) => ({
        plain: `abs(${one.plain})`,
        free: `\\left|${one.free}\\right|`,
        structure: `(absolute ${one.structure})`,
      })),
      scalar.map((one) => ({
        plain: `conj(${one.plain})`,
        free: `\\overline{${one.free}}`,
        structure: `(conjugate ${one.structure})`,
      })),
    ),
  };
}).scalar;

describe('laws of reading', () => {
  it('reads both spellings as the tree they were written from, without doubt', () => {
    fc.assert(
      fc.property(scalars, ({ plain, free, structure }) => {
        for (const text of [plain, free]) {
          const { tree, diagnostics } = parse(text, { kind: 'scalar', symbols });
          expect(diagnostics).toEqual([]);
          expect(tree && structureOf(tree)).toBe(structure);
        }
      }),
      { numRuns: 1500 },
    );
  });

  it('prints LaTeX that reads back as the same tree and typesets', () => {
    fc.assert(
      fc.property(scalars, ({ free, structure }) => {
        const { tree } = parse(free, { kind: 'scalar', symbols });
        if (tree === null) throw new Error(free);
        const latex = printLatex(tree);
        const again = parse(latex, { kind: 'scalar', symbols });
        expect(again.diagnostics).toEqual([]);
        expect(again.tree && structureOf(again.tree)).toBe(structure);
        expect(again.tree && printLatex(again.tree)).toBe(latex);
        expect(() => katex.renderToString(latex, { throwOnError: true, strict: 'error', trust: false })).not.toThrow();
        expect(printPlain(tree)).not.toMatch(/[\\{}^_|<>]/);
      }),
      { numRuns: 700 },
    );
  });

  it('does not mind white space around signs, nor decoration around the whole', () => {
    fc.assert(
      fc.property(
        scalars,
        fc.constantFrom('  ', '\\,', '\\quad ', '\u00a0', '~', '\n'),
        ({ plain, structure }, space) => {
          const text = `$${space}${plain.replace(/([-+*/()])/g, `${space}$1${space}`)}${space}$.`;
          const { tree } = parse(text, { kind: 'scalar', symbols });
          expect(tree && structureOf(tree)).toBe(structure);
        },
      ),
      { numRuns: 500 },
    );
  });

  it('reads entries of a matrix, values and components as it reads them alone', () => {
    fc.assert(
      fc.property(scalars, scalars, (one, other) => {
        const readAs = (kind: AnswerKind, text: string): string | null => {
          const { tree } = parse(text, { kind, symbols });
          return tree && structureOf(tree);
        };
        const { free: a, structure: s } = one;
        const { free: b, structure: t } = other;
        expect(readAs('operator', `[[${a}, ${b}],[${b}, ${a}]]`)).toBe(`[${s} ${t}; ${t} ${s}]`);
        expect(readAs('operator', `\\begin{pmatrix}${a}&${b}\\\\${b}&${a}\\end{pmatrix}`)).toBe(
          `[${s} ${t}; ${t} ${s}]`,
        );
        expect(readAs('state', `(${a}, ${b})`)).toBe(`[${s}; ${t}]`);
        expect(readAs('eigenvalues', `{${a}, ${b}}`)).toBe(`values(${s}, ${t})`);
        expect(readAs('eigenvalues', `E_+ = ${a}, E_- = ${b}`)).toBe(`values(${s}, ${t})`);
        expect(readAs('vector', `(${a}, ${b}, ${a})`)).toBe(`list(${s}, ${t}, ${s})`);
        expect(readAs('scalar', `y = ${a}`)).toBe(s);
      }),
      { numRuns: 300 },
    );
  });

  it('never throws, and says why whenever it reads nothing', () => {
    const kinds = fc.constantFrom<AnswerKind[]>(
      'scalar',
      'quantity',
      'operator',
      'pauli',
      'eigenvalues',
      'state',
      'eigenpairs',
      'vector',
      'choice',
    );
    const texts = fc.oneof(
      fc.string({ maxLength: 60 }),
      fc.string({ unit: 'binary', maxLength: 40 }),
      fc.string({ unit: fc.constantFrom(...'()[]{}|<>^_+-*/,;:=\\$&½²₁ħωσS ixyz123.±†√'), maxLength: 40 }),
    );
    fc.assert(
      fc.property(texts, kinds, (text, kind) => {
        const { readable, diagnostics, latex } = read(text, { kind, symbols, options: { choices: ['up'] } });
        if (readable) expect(latex).not.toBe('');
        else expect(diagnostics.length).toBeGreaterThan(0);
        for (const { span } of diagnostics) {
          expect(span.start).toBeLessThanOrEqual(span.end);
          expect(span.end).toBeLessThanOrEqual([...text].length);
        }
      }),
      { numRuns: 4000 },
    );
  });

  it('reads any declared name in each of its spellings', () => {
    const bases = fc.constantFrom('a', 'q', 'Z', 'omega', 'Delta', 'phi', 'rf', 'energy');
    const indices = fc.constantFrom('', '0', '1', '12', 'c', 'rf', 'alpha', '+');
    fc.assert(
      fc.property(bases, indices, fc.integer({ min: 0, max: 2 }), (base, index, primes) => {
        const name = base + (index === '' ? '' : `_${index}`) + "'".repeat(primes);
        const table: Symbols = { [name]: 'real' };
        const texts = [name, `2*${name} - ${name}`];
        if (index !== '') texts.push(base + `_{${index}}` + "'".repeat(primes));
        if (/^\d+$/.test(index)) texts.push(base + index + "'".repeat(primes));
        for (const text of texts) {
          const { tree, diagnostics } = parse(text, { kind: 'scalar', symbols: table });
          expect(diagnostics).toEqual([]);
          if (tree === null) throw new Error(text);
          expect(structureOf(tree)).toContain(`'${name}`);
          const again = parse(printLatex(tree), { kind: 'scalar', symbols: table });
          expect(again.tree && structureOf(again.tree)).toBe(structureOf(tree));
        }
      }),
      { numRuns: 400 },
    );
  });
});
