import { type Graph, type Node, type Variable } from '../algebra/graph';
import { toNumber } from '../algebra/rational';
import { NumericPoint } from './numeric';
import { Random } from './random';

/** A condition that every sample point must meet. */
export interface Requirement {
  readonly left: Node;
  readonly right: Node;
  readonly relation: '<' | '<=' | '>' | '>=' | '!=' | 'real';
}

const TRIES = 60;

/**
 * Points of the domain, drawn from a seed: variables in their domains, requirements met. The first points are moderate
 * two-figure values; later ones reach several orders of magnitude and every pattern of signs.
 */
export class SamplePoints {
  private readonly random: Random;
  private readonly points: (NumericPoint | null)[] = [];

  constructor(
    readonly graph: Graph,
    seed: number,
    private readonly requirements: readonly Requirement[],
  ) {
    this.random = new Random(seed);
  }

  /** The k-th point, or null where no point with the requirements was found. */
  at(k: number): NumericPoint | null {
    while (this.points.length <= k) this.points.push(this.draw(this.points.length));
    return this.points[k] ?? null;
  }

  private draw(k: number): NumericPoint | null {
    for (let attempt = 0; attempt < TRIES; attempt++) {
      const variables = this.graph.variables;
      const values = new Float64Array(variables.length);
      // Points that fail are drawn again closer to the origin: an assumption often bounds a sum of squares.
      const shrink = this.requirements.length === 0 ? 1 : 0.85 ** attempt;
      for (let v = 0; v < variables.length; v++) {
        const free = !this.graph.solved.has(v);
        values[v] = free ? this.value(variables[v]!, v, k, shrink) : this.signOf(variables[v]!);
      }
      const point = new NumericPoint(this.graph, values);
      if (this.admits(point)) return point;
    }
    return null;
  }

  private value(variable: Variable, v: number, k: number, shrink: number): number {
    const unit = this.random.unit();
    const wide = k >= 6 && k % 3 === 2;
    if (variable.domain === 'between' && Number.isFinite(variable.low) && Number.isFinite(variable.high)) {
      const share = Math.round((0.06 + 0.88 * unit) * 100) / 100;
      return variable.low + (variable.high - variable.low) * share;
    }
    if (variable.domain === 'integer') return Math.floor(unit * (wide ? 40 : 9)) - (wide ? 20 : 4);
    const scale = wide ? 10 ** (6 * this.random.unit() - 3) : 1;
    let size = Math.round((0.31 + 2.4 * unit) * 100) / 100;
    const landmark = k >= 6 && k % 3 === 1 ? this.landmark(k, v) : 0;
    if (landmark > 0) size = landmark * (0.7 + 0.1 * unit + (this.random.next() & 1 ? 0.6 : 0));
    else size *= scale;
    if (variable.name !== 'hbar') size *= shrink;
    const low = Number.isFinite(variable.low) ? variable.low : null;
    const high = Number.isFinite(variable.high) ? variable.high : null;
    if (variable.domain === 'between') return low !== null ? low + size : high !== null ? high - size : size;
    const signed = variable.domain === 'real' || variable.domain === 'nonzero';
    return signed && this.random.next() & 1 ? -size : size;
  }

  /** Sign of a variable that an assumption determines up to its sign. */
  private signOf(variable: Variable): number {
    return variable.domain === 'real' && this.random.next() & 1 ? -1 : 1;
  }

  /** A number of the expressions away from 1, so that later points lie on both sides of it; 0 if there is none. */
  private landmark(k: number, v: number): number {
    const sizes = this.graph.numbers.map((n) => Math.abs(toNumber(n))).filter((n) => n > 2.5 || (n < 0.2 && n > 0));
    const value = sizes[(Math.floor(k / 3) + v) % Math.max(1, sizes.length)] ?? 0;
    return value < 1e100 ? value : 0;
  }

  private admits(point: NumericPoint): boolean {
    for (const { left, right, relation } of this.requirements) {
      point.evaluate(Math.max(left, right));
      if (!point.isKnown(left) || !point.isKnown(right)) return false;
      const difference = point.re[left]! - point.re[right]!;
      const slack = point.error[left]! + point.error[right]!;
      if (Math.abs(point.im[left]!) > slack + 1e-12) return false;
      switch (relation) {
        case '<':
          if (!(difference < -slack)) return false;
          break;
        case '<=':
          if (!(difference <= slack)) return false;
          break;
        case '>':
          if (!(difference > slack)) return false;
          break;
        case '>=':
          if (!(difference >= -slack)) return false;
          break;
        case '!=':
          if (!(Math.abs(difference) > slack)) return false;
          break;
        case 'real':
          break;
      }
    }
    return true;
  }
}
