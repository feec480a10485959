import { type Graph, type Node, Op } from '../algebra/graph';
import { nodesUnder } from '../algebra/rebuild';
import { type NumericPoint } from '../equivalence/numeric';
import { appliesAt, type FormChange, isPlace, type Place } from './form-change';

const MOST_PLACES = 8;

/**
 * Values of changed expressions at one point, in plain doubles: a filter that costs a microsecond where building the
 * changed expression costs tens. What passes is then proved.
 */
export class FormEvaluation {
  private readonly g: Graph;
  private readonly nodes: Int32Array;
  readonly re: Float64Array;
  readonly im: Float64Array;

  constructor(
    private readonly point: NumericPoint,
    readonly roots: readonly Node[],
  ) {
    this.g = point.graph;
    this.nodes = nodesUnder(this.g, roots);
    const size = (this.nodes[this.nodes.length - 1] ?? 0) + 1;
    this.re = this.g.buffer(size);
    this.im = this.g.buffer(size);
    point.evaluate(size - 1);
  }

  /** Whether there are sines, cosines or exponentials, which a normal form may write otherwise. */
  get hasFunctions(): boolean {
    return this.nodes.some((node) => {
      const op = this.g.op[node]!;
      return op === Op.Exp || op === Op.Sin || op === Op.Cos;
    });
  }

  private readonly placesOf = new Map<FormChange, readonly Place[]>();

  /** Where a change can be made: everywhere, at all functions of one angle, at each single node. */
  places(change: FormChange): readonly Place[] {
    const known = this.placesOf.get(change);
    if (known) return known;
    const found: Node[] = [];
    for (const node of this.nodes) if (appliesAt(this.g, node, change)) found.push(node);
    const places: Place[] = found.length === 0 ? [] : [null];
    if (found.length > 1) {
      places.push(...this.byAngle(found), ...found.slice(0, MOST_PLACES).map((node) => new Set([node])));
    }
    this.placesOf.set(change, places);
    return places;
  }

  /** The sines and cosines of each angle, where there are other functions too. */
  private byAngle(found: readonly Node[]): Set<Node>[] {
    const groups = new Map<Node, Set<Node>>();
    for (const node of found) {
      if (this.g.op[node] !== Op.Sin && this.g.op[node] !== Op.Cos) continue;
      const angle = this.g.a[node]!;
      const group = groups.get(angle) ?? new Set();
      groups.set(angle, group.add(node));
    }
    return [...groups.values()].filter((group) => group.size > 1 && group.size < found.length).slice(0, MOST_PLACES);
  }

  /** Fills `re` and `im` of the roots and all below with the values after the change. */
  evaluate(change: FormChange, place: Place): void {
    const { g, re, im, point } = this;
    g.spend(this.nodes.length);
    for (const node of this.nodes) {
      const op = g.op[node]!;
      const a = g.a[node]!;
      if (op < Op.Add) {
        re[node] = point.re[node]!;
        im[node] = point.im[node]!;
        continue;
      }
      const here = isPlace(g, node, change, place);
      let x = re[a]!;
      let y = im[a]!;
      if (op === Op.Add || op === Op.Multiply) {
        const b = g.b[node]!;
        let u = re[b]!;
        let v = im[b]!;
        if (here) {
          if (a === g.i) [x, y] = [1, 0];
          if (b === g.i) [u, v] = [1, 0];
        }
        re[node] = op === Op.Add ? x + u : x * u - y * v;
        im[node] = op === Op.Add ? y + v : x * v + y * u;
        continue;
      }
      if (here && change === 'half-angle') [x, y] = [x / 2, y / 2];
      else if (here && change === 'double-angle') [x, y] = [x * 2, y * 2];
      switch (op) {
        case Op.Power:
          this.setPower(node, x, y, g.b[node]!);
          break;
        case Op.Root:
          if (here && change === 'without-root') {
            re[node] = x;
            im[node] = y;
          } else this.setPower(node, x, y, 1 / g.b[node]!);
          break;
        case Op.Exp: {
          const size = Math.exp(x);
          re[node] = size * Math.cos(y);
          im[node] = size * Math.sin(y);
          break;
        }
        case Op.Ln:
          re[node] = Math.log(Math.sqrt(x * x + y * y));
          im[node] = Math.atan2(y, x);
          break;
        case Op.Abs:
          re[node] = Math.abs(x);
          im[node] = 0;
          break;
        default: {
          const sine = (op === Op.Sin) !== (here && change === 'sine-cosine');
          const [c, s] = y === 0 ? [1, 0] : [Math.cosh(y), Math.sinh(y)];
          re[node] = (sine ? Math.sin(x) : Math.cos(x)) * c;
          im[node] = s === 0 ? 0 : sine ? Math.cos(x) * s : -Math.sin(x) * s;
        }
      }
    }
  }

  private setPower(node: Node, x: number, y: number, n: number): void {
    if (y === 0 && (x >= 0 || Number.isInteger(n))) {
      this.re[node] = x ** n;
      this.im[node] = 0;
      return;
    }
    const size = Math.sqrt(x * x + y * y) ** n;
    const angle = Math.atan2(y, x) * n;
    this.re[node] = size * Math.cos(angle);
    this.im[node] = size * Math.sin(angle);
  }
}
