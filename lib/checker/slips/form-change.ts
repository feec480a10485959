import { type Graph, type Node, Op } from '../algebra/graph';
import { absolute, root } from '../algebra/roots';
import { ln } from '../algebra/logarithm';
import { rational } from '../algebra/rational';
import { add, cos, exp, multiply, power, scale, sin } from '../algebra/scalars';

/** Changes of an expression's form that students make. */
export type FormChange = 'without-i' | 'half-angle' | 'double-angle' | 'sine-cosine' | 'without-root';

/** Whether a change applies at a node. */
export function appliesAt(g: Graph, node: Node, change: FormChange): boolean {
  const op = g.op[node]!;
  switch (change) {
    case 'without-i':
      return (op === Op.Add || op === Op.Multiply) && (g.a[node] === g.i || g.b[node] === g.i);
    case 'half-angle':
    case 'double-angle':
      return op === Op.Sin || op === Op.Cos || op === Op.Exp;
    case 'sine-cosine':
      return op === Op.Sin || op === Op.Cos;
    case 'without-root':
      return op === Op.Root && g.b[node] === 2;
  }
}

/** Nodes at which a change is made together; null for everywhere it applies. */
export type Place = ReadonlySet<Node> | null;

/** Whether a node stands at a place of the change. */
export const isPlace = (g: Graph, node: Node, change: FormChange, place: Place): boolean =>
  place === null ? appliesAt(g, node, change) : place.has(node);

/** Nodes under some roots, children first. */
export function nodesUnder(g: Graph, roots: readonly Node[]): Int32Array {
  const last = roots.reduce((x, y) => Math.max(x, y), 0);
  const marks = new Uint8Array(last + 1);
  for (const node of roots) marks[node] = 1;
  let count = 0;
  for (let node = last; node >= 0; node--) {
    if (marks[node] === 0) continue;
    count++;
    const op = g.op[node]!;
    if (op === Op.Symbol) {
      const solution = g.solved.get(g.a[node]!);
      if (solution !== undefined) marks[solution] = 1;
    } else if (op >= Op.Add) {
      marks[g.a[node]!] = 1;
      if (op === Op.Add || op === Op.Multiply) marks[g.b[node]!] = 1;
    }
  }
  const nodes = new Int32Array(count);
  for (let node = 0, k = 0; node <= last; node++) if (marks[node] === 1) nodes[k++] = node;
  return nodes;
}

/** Builds the changed expressions exactly. */
export function rebuild(g: Graph, roots: readonly Node[], change: FormChange, place: Place): ReadonlyMap<Node, Node> {
  const built = new Map<Node, Node>();
  const get = (node: Node): Node => built.get(node) ?? node;
  for (const node of nodesUnder(g, roots)) {
    const op = g.op[node]!;
    if (op < Op.Add) continue;
    const here = isPlace(g, node, change, place);
    const withoutI = here && change === 'without-i';
    const child = (x: Node): Node => (withoutI && x === g.i ? g.one : get(x));
    const a = child(g.a[node]!);
    const b = g.b[node]!;
    built.set(node, combine(op, a, b, here));
    function combine(operation: number, x: Node, y: number, changed: boolean): Node {
      switch (operation) {
        case Op.Add:
          return add(g, x, child(y));
        case Op.Multiply:
          return multiply(g, x, child(y));
        case Op.Power:
          return power(g, x, y);
        case Op.Root:
          return changed ? x : root(g, x, y);
        case Op.Ln:
          return ln(g, x);
        case Op.Abs:
          return absolute(g, x);
        default: {
          const factor = changed && change === 'half-angle' ? rational(1, 2) : rational(2);
          const scaled = changed && change !== 'sine-cosine' ? scale(g, factor, x) : x;
          if (operation === Op.Exp) return exp(g, scaled);
          const swapped = changed && change === 'sine-cosine';
          return (operation === Op.Sin) === swapped ? cos(g, scaled) : sin(g, scaled);
        }
      }
    }
  }
  return built;
}
