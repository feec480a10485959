import { printLatex } from '@/lib/checker/notation/print-latex';
import { type Expression } from '@/lib/checker/notation/tree';
import { type DrawnValues, type TemplateContent } from './content';
import { slotPattern } from './formula-pieces';
import { readValue } from './read-text';
import { typesetFormula } from './typeset-formula';
import { type TypesetValue } from './typeset-value';

/**
 * A formula in Markdown: between two pairs of dollar signs, or between two single ones with no blank just inside them and
 * no digit behind; a dollar after a backslash is only a dollar. The same rule as where Markdown is rendered.
 */
const formulaPattern =
  /(?<!\\)(?:(\$\$)((?:\\[\s\S]|[^\\$])+)\$\$|(\$)(?![\s$])((?:\\[\s\S]|[^\\$])+)(?<!\s)\$(?!\d))/g;

/**
 * Sets drawn values into a Markdown text: `{{n}}` in prose becomes a formula of its own, and within a formula the value
 * is set as TeX that fits its place. Only names of drawn values are replaced.
 */
export function interpolate(
  text: string,
  values: DrawnValues,
  content: Pick<TemplateContent, 'symbols'> = { symbols: [] },
): string {
  if (!text.includes('{{')) return text;
  const known = new Map<string, TypesetValue>();
  const valueOf = (name: string): TypesetValue | undefined => {
    const value = Object.hasOwn(values, name) ? values[name] : undefined;
    if (value === undefined) return undefined;
    if (!known.has(name)) known.set(name, typesetValue(value, content.symbols));
    return known.get(name);
  };
  let result = '';
  let at = 0;
  for (const match of text.matchAll(formulaPattern)) {
    const [whole, pair, display = '', single, inline = ''] = match;
    const dollars = pair ?? single ?? '';
    result += inProse(text.slice(at, match.index), valueOf);
    // A value that falls away may leave a blank inside the dollar, which would then be none.
    result += dollars + typesetFormula(pair ? display : inline, valueOf).trim() + dollars;
    at = match.index + whole.length;
  }
  return result + inProse(text.slice(at), valueOf);
}

/** The names that stand between double braces in a text, each with its place. */
export function slotsIn(text: string): { name: string; at: number }[] {
  return [...text.matchAll(new RegExp(slotPattern, 'g'))].map((match) => ({ name: match[1] ?? '', at: match.index }));
}

/** How a drawn value is set into formulas; text that cannot be read is set upright as it stands. */
export function typesetValue(text: string, symbols: TemplateContent['symbols'] = []): TypesetValue {
  const read = readValue(text, symbols);
  if (!read.ok) {
    const latex = `\\text{${text.replace(/[\\{}$%&#_^~]/g, ' ')}}`;
    return { latex, magnitude: latex, negative: false, isOne: false, isZero: false, isSum: false };
  }
  const tree = bare(read.tree);
  const only = tree.node === 'sum' && tree.terms.length === 1 ? tree.terms[0] : undefined;
  const body = only?.sign === '-' ? bare(only.body) : tree;
  return {
    latex: printLatex(tree),
    negative: only?.sign === '-',
    magnitude: printLatex(body),
    isOne: body.node === 'number' && body.numerator === body.denominator,
    isZero: body.node === 'number' && body.numerator === 0n,
    isSum: body.node === 'sum',
  };
}

function inProse(text: string, valueOf: (name: string) => TypesetValue | undefined): string {
  return text.replace(new RegExp(slotPattern, 'g'), (slot, name: string) => {
    const value = valueOf(name);
    return value === undefined ? slot : `$${value.latex}$`;
  });
}

function bare(tree: Expression): Expression {
  return tree.node === 'group' ? bare(tree.body) : tree;
}
