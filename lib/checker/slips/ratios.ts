import { type Node } from '../algebra/graph';
import { looksEqual, ratioOf, scaledBy, type Values } from './numeric-match';
import { type Trial } from './slip';

/** Whether the answer may be a given factor times the reference, judged at the trial's point. */
export class Ratios {
  private readonly ratios: readonly { readonly re: number; readonly im: number }[];

  constructor(
    private readonly trial: Trial,
    reference: Values,
    answer: Values,
  ) {
    const direct = ratioOf(reference, answer);
    const candidates = direct ? [direct] : [];
    if (trial.reference.kind === 'eigenvalues' && answer.re.length === 2) {
      const swapped = ratioOf(reference, { re: [...answer.re].reverse(), im: [...answer.im].reverse() });
      if (swapped) candidates.push(swapped);
    }
    const { kind } = trial.reference;
    this.ratios = candidates.filter((ratio) =>
      looksEqual(kind, trial.context.options, scaledBy(reference, ratio), answer),
    );
  }

  mayBe(factor: Node): boolean {
    const { reference, context, point } = this.trial;
    if (reference.kind === 'eigenpairs' || context.options.tolerance) return true;
    if (this.ratios.length === 0) return false;
    point.evaluate(factor);
    const [re, im] = [point.re[factor]!, point.im[factor]!];
    const phase = context.options.upToPhase && reference.kind !== 'scalar';
    return this.ratios.some((ratio) => {
      const distance = phase
        ? Math.hypot(re, im) - Math.hypot(ratio.re, ratio.im)
        : Math.hypot(re - ratio.re, im - ratio.im);
      return Math.abs(distance) < 1e-8 * (Math.hypot(re, im) + 1e-12);
    });
  }
}
