import { type Graph, type Node, Op } from './graph';
import { ln } from './logarithm';
import { absolute, root } from './roots';
import { add, cos, exp, multiply, power, sin } from './scalars';

/** What stands for a node instead of what it would be from its rebuilt children; null to leave it. */
export type Replace = (node: Node, rebuilt: (child: Node) => Node) => Node | null;

/** Builds expressions anew from the leaves up with some nodes replaced; the map gives the new node of each old one. */
export function rebuild(g: Graph, roots: readonly Node[], replace: Replace): ReadonlyMap<Node, Node> {
  const built = new Map<Node, Node>();
  const get = (node: Node): Node => built.get(node) ?? node;
  for (const node of nodesUnder(g, roots)) {
    if (g.op[node]! < Op.Add) continue;
    built.set(node, replace(node, get) ?? combine(g, g.op[node]!, get(g.a[node]!), g.b[node]!, get));
  }
  return built;
}

function combine(g: Graph, op: number, x: Node, b: number, get: (child: Node) => Node): Node {
  switch (op) {
    case Op.Add:
      return add(g, x, get(b));
    case Op.Multiply:
      return multiply(g, x, get(b));
    case Op.Power:
      return power(g, x, b);
    case Op.Root:
      return root(g, x, b);
    case Op.Exp:
      return exp(g, x);
    case Op.Ln:
      return ln(g, x);
    case Op.Sin:
      return sin(g, x);
    case Op.Cos:
      return cos(g, x);
    default:
      return absolute(g, x);
  }
}

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
