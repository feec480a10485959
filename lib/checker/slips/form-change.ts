import { type Graph, type Node, Op } from '../algebra/graph';
import { HALF, TWO } from '../algebra/rational';
import { rebuild } from '../algebra/rebuild';
import { add, cos, exp, multiply, scale, sin } from '../algebra/scalars';

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

/** Builds the changed expressions exactly. */
export function rebuildChanged(
  g: Graph,
  roots: readonly Node[],
  change: FormChange,
  place: Place,
): ReadonlyMap<Node, Node> {
  return rebuild(g, roots, (node, rebuilt) => {
    if (!isPlace(g, node, change, place)) return null;
    const a = g.a[node]!;
    switch (change) {
      case 'without-i': {
        const child = (x: Node): Node => (x === g.i ? g.one : rebuilt(x));
        const [x, y] = [child(a), child(g.b[node]!)];
        return g.op[node] === Op.Add ? add(g, x, y) : multiply(g, x, y);
      }
      case 'half-angle':
      case 'double-angle': {
        const scaled = scale(g, change === 'half-angle' ? HALF : TWO, rebuilt(a));
        return g.op[node] === Op.Exp ? exp(g, scaled) : g.op[node] === Op.Sin ? sin(g, scaled) : cos(g, scaled);
      }
      case 'sine-cosine':
        return g.op[node] === Op.Sin ? cos(g, rebuilt(a)) : sin(g, rebuilt(a));
      case 'without-root':
        return rebuilt(a);
    }
  });
}
