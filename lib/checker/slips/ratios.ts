import { looksEqual, ratioOf, scaledBy, type Values } from './numeric-match';
import { type Factor, type Trial } from './slip';

interface Number2 {
  readonly re: number;
  readonly im: number;
}

/** The factors by which an answer may differ from some values of a reference, judged at the trial's point. */
export class Ratios {
  private readonly ratios: readonly Number2[];
  /** Nothing can be said: a tolerance is in play. */
  private readonly open: boolean;
  private readonly upToPhase: boolean;
  private readonly hbar: number;

  constructor({ reference, context, point }: Trial, values: Values, answer: Values) {
    const { kind } = reference;
    const { options } = context;
    this.hbar = point.re[context.environment.hbar]!;
    this.open = options.tolerance !== undefined;
    this.upToPhase = options.upToPhase === true && kind !== 'scalar' && kind !== 'vector' && kind !== 'eigenpairs';
    const candidates: Number2[] = [];
    const direct = ratioOf(values, answer);
    if (direct && !this.open) candidates.push(direct);
    if (kind === 'eigenvalues' && direct && answer.re.length === 2) {
      const swapped = ratioOf(values, { re: [answer.re[1]!, answer.re[0]!], im: [answer.im[1]!, answer.im[0]!] });
      if (swapped) candidates.push(swapped);
    }
    this.ratios = candidates.filter((ratio) => looksEqual(kind, options, scaledBy(values, ratio), answer));
  }

  /** Whether the answer looks like a constant times the values. */
  get isConstant(): boolean {
    return this.open || this.ratios.length > 0;
  }

  mayBeOne(): boolean {
    return this.isNear(1, 0);
  }

  mayBe(factor: Factor): boolean {
    if (this.open) return true;
    return this.ratios.length > 0 && this.isNear(factor.re(this.hbar), factor.im(this.hbar));
  }

  private isNear(re: number, im: number): boolean {
    if (this.open) return true;
    const size = Math.hypot(re, im);
    for (const ratio of this.ratios) {
      const distance = this.upToPhase
        ? size - Math.hypot(ratio.re, ratio.im)
        : Math.hypot(re - ratio.re, im - ratio.im);
      if (Math.abs(distance) <= 1e-8 * size) return true;
    }
    return false;
  }
}
