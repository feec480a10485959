import { type Environment } from '../algebra/environment';
import { type Node, Op } from '../algebra/graph';
import { type NumericPoint } from '../equivalence/numeric';

const POWERS_OF_TEN = Array.from({ length: 12 }, (_, n) => Number(`1e${n}`));

/** A real number in at most seven figures, without a trailing zero. */
export function formatNumber(x: number): string {
  if (x === 0) return '0';
  const size = Math.abs(x);
  if (size >= 1e-4 && size < 1e7) {
    // Rounded by scaling: a tenth of the time of toPrecision, and seven figures do not need more care.
    const unit = POWERS_OF_TEN[6 - Math.floor(Math.log10(size))] ?? 1;
    return String(Math.round(x * unit) / unit);
  }
  return x
    .toExponential(5)
    .replace(/\.?0+e/, 'e')
    .replace('e+', 'e');
}

export function formatComplex(re: number, im: number): string {
  const negligible = 1e-13 * Math.sqrt(re * re + im * im);
  if (Math.abs(im) <= negligible) return formatNumber(re);
  const size = formatNumber(Math.abs(im));
  const imaginary = size === '1' ? 'i' : `${size} i`;
  if (Math.abs(re) <= negligible) return im < 0 ? `-${imaginary}` : imaginary;
  return `${formatNumber(re)} ${im < 0 ? '-' : '+'} ${imaginary}`;
}

/** Value of a node at an evaluated point. */
export const formatValue = (point: NumericPoint, node: Node): string => formatComplex(point.re[node]!, point.im[node]!);

/** Values at a point of the symbols that the texts name, by declared name; ħ (as `hbar`) where the nodes rest on it. */
export function witnessValues(
  environment: Environment,
  point: NumericPoint,
  nodes: readonly Node[],
): Record<string, string> {
  const { g, solutions, hbar } = environment;
  const parts = new Map<string, { re: number; im: number }>();
  for (const [index, { name, part }] of g.variables.entries()) {
    if (name === '' || (index === g.a[hbar] && !restsOn(environment, nodes, hbar))) continue;
    const solution = solutions.get(index);
    let value = point.values[index]!;
    if (solution !== undefined) {
      point.evaluate(solution);
      value = point.re[solution]!;
    }
    const known = parts.get(name) ?? { re: 0, im: 0 };
    parts.set(name, part === 'imaginary' ? { re: known.re, im: value } : { re: value, im: known.im });
  }
  const values: Record<string, string> = {};
  for (const [name, { re, im }] of parts) values[name] = formatComplex(re, im);
  return values;
}

/** Whether one of the nodes rests on a variable. */
function restsOn({ g }: Environment, nodes: readonly Node[], variable: Node): boolean {
  const last = Math.max(...nodes);
  const marks = new Uint8Array(last + 1);
  for (const node of nodes) marks[node] = 1;
  for (let node = last; node > variable; node--) {
    const op = g.op[node]!;
    if (marks[node] === 0 || op < Op.Add) continue;
    marks[g.a[node]!] = 1;
    if (op === Op.Add || op === Op.Multiply) marks[g.b[node]!] = 1;
  }
  return marks[variable] === 1;
}
