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
const RANGES = ['landmark', 'turns', 'wide', 'moderate'] as const;

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
    const range = this.rangeOf(k);
    if (variable.domain === 'between' && Number.isFinite(variable.low) && Number.isFinite(variable.high)) {
      const share = range === 'moderate' ? Math.round((0.06 + 0.88 * unit) * 100) / 100 : unit;
      return variable.low + (variable.high - variable.low) * share;
    }
    if (variable.domain === 'integer') {
      return range === 'wide' ? Math.floor(unit * 40) - 20 : Math.floor(unit * 9) - 4;
    }
    const moderate = Math.round((0.31 + 2.4 * unit) * 100) / 100;
    let size = moderate;
    if (range === 'turns') size = Math.round(2000 * unit) / 100 + 0.01;
    else if (range === 'wide') size = moderate * 10 ** (6 * this.random.unit() - 3);
    else if (range === 'landmark') {
      const landmark = this.landmark(k, v);
      if (landmark > 0) size = landmark * (0.7 + 0.1 * unit + (this.random.next() & 1 ? 0.6 : 0));
    }
    if (variable.name !== 'hbar') size *= shrink;
    const low = Number.isFinite(variable.low) ? variable.low : null;
    const high = Number.isFinite(variable.high) ? variable.high : null;
    if (variable.domain === 'between') return low !== null ? low + size : high !== null ? high - size : size;
    const signed = variable.domain === 'real' || variable.domain === 'nonzero';
    return signed && this.random.next() & 1 ? -size : size;
  }

  /**
   * Where the values of the k-th point lie: about 1 at first; then also over a few turns of an angle, over six orders of
   * magnitude, and on both sides of the numbers of the texts; at last each variable by itself.
   */
  private rangeOf(k: number): 'moderate' | 'turns' | 'wide' | 'landmark' {
    if (k < 6) return 'moderate';
    return RANGES[k < 30 ? k % 4 : this.random.below(4)]!;
  }

  /** Sign of a variable that an assumption determines up to its sign. */
  private signOf(variable: Variable): number {
    return variable.domain === 'real' && this.random.next() & 1 ? -1 : 1;
  }

  /** A number of the expressions away from 1, so that later points lie on both sides of it; 0 if there is none. */
  private landmark(k: number, v: number): number {
    const sizes = this.graph.numbers.map((n) => Math.abs(toNumber(n))).filter((n) => n > 2.5 || (n < 0.2 && n > 0));
    const value = sizes[(Math.floor(k / 4) + v) % Math.max(1, sizes.length)] ?? 0;
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
