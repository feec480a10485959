import { type Environment } from '../algebra/environment';
import { type Node, Op } from '../algebra/graph';
import { type NumericPoint } from '../equivalence/numeric';

/** A real number in at most seven figures, without a trailing zero. */
export function formatNumber(x: number): string {
  if (x === 0) return '0';
  const size = Math.abs(x);
  if (size >= 1e-4 && size < 1e7) return String(Number(x.toPrecision(7)));
  return x
    .toExponential(5)
    .replace(/\.?0+e/, 'e')
    .replace('e+', 'e');
}

export function formatComplex(re: number, im: number): string {
  const negligible = 1e-13 * Math.hypot(re, im);
  if (Math.abs(im) <= negligible) return formatNumber(re);
  const size = formatNumber(Math.abs(im));
  const imaginary = size === '1' ? 'i' : `${size} i`;
  if (Math.abs(re) <= negligible) return im < 0 ? `-${imaginary}` : imaginary;
  return `${formatNumber(re)} ${im < 0 ? '-' : '+'} ${imaginary}`;
}

/** Value of a node at an evaluated point. */
export const formatValue = (point: NumericPoint, node: Node): string => formatComplex(point.re[node]!, point.im[node]!);

/** Values of the symbols on which the nodes rest, by declared name; ħ as `hbar`. */
export function witnessValues(
  environment: Environment,
  point: NumericPoint,
  nodes: readonly Node[],
): Record<string, string> {
  const { g, solutions } = environment;
  const used = variablesUnder(environment, nodes);
  const parts = new Map<string, { re: number; im: number }>();
  for (const index of used) {
    const { name, part } = g.variables[index]!;
    if (name === '') continue;
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

/** Indices of the variables under some nodes, with those that an assumption determines among them. */
function variablesUnder({ g, solutions }: Environment, nodes: readonly Node[]): number[] {
  const marks = new Uint8Array(g.size);
  let last = 0;
  for (const node of nodes) {
    marks[node] = 1;
    last = Math.max(last, node);
  }
  const found = new Set<number>();
  for (let node = last; node >= 0; node--) {
    if (marks[node] === 0) continue;
    const op = g.op[node]!;
    const a = g.a[node]!;
    if (op === Op.Symbol) {
      found.add(a);
      const solution = g.solved.get(a);
      if (solution !== undefined) marks[solution] = 1;
    } else if (op >= Op.Add) {
      marks[a] = 1;
      if (op === Op.Add || op === Op.Multiply) marks[g.b[node]!] = 1;
    }
  }
  for (const [index, solution] of solutions) if (marks[solution] === 1) found.add(index);
  return [...found].sort((x, y) => x - y);
}
