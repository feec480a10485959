import { type CheckOptions } from '../contract';
import { type AnswerValue } from '../kinds/answer-value';
import { type Values } from './numeric-match';
import { type Complex } from './slip';

/** Relative distance within which two doubles look equal. */
const CLOSE = 1e-9;

/** The factors by which an answer may differ from some values of a reference, judged at one point. */
export class Ratios {
  private readonly ratios: Complex[] = [];
  /** Nothing can be said: a tolerance is in play. */
  private readonly open: boolean;
  private readonly upToPhase: boolean;

  constructor(kind: AnswerValue['kind'], options: CheckOptions, values: Values, answer: Values) {
    this.open = options.tolerance !== undefined;
    const ofRay = kind === 'operator' || kind === 'pauli' || kind === 'state';
    this.upToPhase = options.upToPhase === true && ofRay;
    if (this.open || values.re.length !== answer.re.length) return;
    // Up to a scale every multiple agrees already: as a factor it says nothing.
    const upToScale = options.upToScale === true && kind === 'state';
    this.add(values, answer, false, upToScale);
    if (kind === 'eigenvalues') this.add(values, answer, true, false);
  }

  /** Whether the answer looks like a constant times the values. */
  get isConstant(): boolean {
    return this.open || this.ratios.length > 0;
  }

  mayBe({ re, im }: Complex): boolean {
    if (this.open) return true;
    for (const ratio of this.ratios) {
      const size = Math.sqrt(re * re + im * im);
      const distance = this.upToPhase
        ? Math.abs(size - Math.sqrt(ratio.re * ratio.re + ratio.im * ratio.im))
        : Math.abs(re - ratio.re) + Math.abs(im - ratio.im);
      if (distance <= 10 * CLOSE * size) return true;
    }
    return false;
  }

  /** Adds the ratio at the largest value, if it serves for all (`swapped`: the answer's two values exchanged). */
  private add(x: Values, y: Values, swapped: boolean, upToScale: boolean): void {
    const n = x.re.length;
    let pivot = 0;
    let largest = 0;
    for (let k = 0; k < n; k++) {
      const square = x.re[k]! * x.re[k]! + x.im[k]! * x.im[k]!;
      if (square > largest) {
        pivot = k;
        largest = square;
      }
    }
    if (!(largest > 0)) return;
    const at = swapped ? 1 - pivot : pivot;
    const re = (y.re[at]! * x.re[pivot]! + y.im[at]! * x.im[pivot]!) / largest;
    const im = (y.im[at]! * x.re[pivot]! - y.re[at]! * x.im[pivot]!) / largest;
    const allowed = CLOSE * Math.sqrt(largest) * (1 + Math.abs(re) + Math.abs(im));
    for (let k = 0; k < n; k++) {
      const j = swapped ? 1 - k : k;
      const gapRe = y.re[j]! - (x.re[k]! * re - x.im[k]! * im);
      const gapIm = y.im[j]! - (x.re[k]! * im + x.im[k]! * re);
      if (!(Math.abs(gapRe) + Math.abs(gapIm) <= allowed)) return;
    }
    this.ratios.push(upToScale ? { re: 1, im: 0 } : { re, im });
  }
}
