import { type Node } from '../algebra/graph';
import { fromPolynomial, normalForm } from '../algebra/normal-form';
import { TooLarge } from '../algebra/polynomial';
import { multiply } from '../algebra/scalars';
import { type AnswerValue, answerValue } from '../kinds/answer-value';
import { nodesOf } from '../kinds/compare';
import { failureOf } from '../kinds/prepare';
import { type Factor, factorsOf } from './factors';
import { featuresOf, type Features } from './features';
import { type FormChange, type Place, rebuild } from './form-change';
import { FormEvaluation } from './form-evaluation';
import { looksEqual, type Values, valuesOf } from './numeric-match';
import { Ratios } from './ratios';
import { mapAllNodes, mapNodes, type Slip, type Trial } from './slip';

/** A change of form at one place, and the factors by which its value differs from the answer at the trial's point. */
export interface ChangedForm {
  readonly shape: FormEvaluation;
  readonly change: FormChange;
  readonly place: Place;
  readonly ratios: Ratios;
}

/** What the tries of one search share. Every change is looked at in doubles at one point before it is built and proved. */
export class SlipSearch {
  readonly answer: Values;
  readonly ratios: Ratios;
  private features: Features | null = null;
  private forms: FormEvaluation[] | null = null;
  private readonly changed = new Map<FormChange, readonly ChangedForm[]>();

  constructor(readonly trial: Trial) {
    const { point, reference, answer } = trial;
    const wanted = nodesOf(reference);
    const given = nodesOf(answer);
    point.evaluate(Math.max(...wanted, ...given));
    this.answer = valuesOf(point, given);
    this.ratios = new Ratios(trial, valuesOf(point, wanted), this.answer);
  }

  fits(slip: Slip): boolean {
    const { trial } = this;
    switch (slip.type) {
      case 'ratio':
        return (
          factorsOf(slip, trial).some((factor) => this.isFactor(trial.reference, this.ratios, factor)) &&
          slip.applies?.(trial) !== false
        );
      case 'value':
        return slip.change(trial.reference, trial).some((changed) => this.agrees(changed));
      case 'test':
        return slip.fits(trial);
      case 'tree':
        return this.holds(slip.needs) && slip.change(trial.referenceTree).some((tree) => this.treeAgrees(tree));
      case 'form':
        return this.changedForms(slip.change).some(
          (form) => form.ratios.mayBeOne() && trial.compare(this.build(form), trial.answer),
        );
    }
  }

  /** Whether the author's tree holds what a slip of trees changes. */
  holds(feature: keyof Features): boolean {
    this.features ??= featuresOf(this.trial.referenceTree);
    return this.features[feature];
  }

  /** Whether the answer is a factor times a value: seen at the point, then proved. */
  isFactor(value: AnswerValue, ratios: Ratios, factor: Factor): boolean {
    if (!ratios.mayBe(factor)) return false;
    const { g } = this.trial.context.environment;
    const node = factor.node();
    const scaled = mapNodes(value, (x) => multiply(g, node, x));
    return this.trial.compare(scaled, this.trial.answer);
  }

  ratiosOf(value: AnswerValue): Ratios {
    const { point } = this.trial;
    const nodes = nodesOf(value);
    point.evaluate(Math.max(...nodes));
    return new Ratios(this.trial, valuesOf(point, nodes), this.answer);
  }

  /** The value of a changed tree. */
  treeValue(tree: Trial['referenceTree']): AnswerValue {
    return answerValue(this.trial.context.environment, this.trial.request.kind, tree);
  }

  /** Every place of a change on the author's form and on the normal form where it moves the value. */
  changedForms(change: FormChange): readonly ChangedForm[] {
    const known = this.changed.get(change);
    if (known) return known;
    const found: ChangedForm[] = [];
    for (const shape of this.shapes()) {
      for (const place of shape.places(change)) {
        shape.evaluate(change, place);
        const ratios = new Ratios(this.trial, valuesOf(shape, shape.roots), this.answer);
        if (ratios.isConstant) found.push({ shape, change, place, ratios });
      }
    }
    this.changed.set(change, found);
    return found;
  }

  /** Builds a changed form exactly. */
  build({ shape, change, place }: ChangedForm): AnswerValue {
    const built = rebuild(this.trial.context.environment.g, shape.roots, change, place);
    let k = 0;
    const next = (): Node => {
      const root = shape.roots[k++]!;
      return built.get(root) ?? root;
    };
    return mapAllNodes(this.trial.reference, next);
  }

  private treeAgrees(tree: Trial['referenceTree']): boolean {
    return quietly(() => this.agrees(this.treeValue(tree)));
  }

  private agrees(changed: AnswerValue): boolean {
    const { point, answer, compare, reference, context } = this.trial;
    const nodes = nodesOf(changed);
    point.evaluate(Math.max(...nodes));
    return looksEqual(reference.kind, context.options, valuesOf(point, nodes), this.answer) && compare(changed, answer);
  }

  private shapes(): FormEvaluation[] {
    if (this.forms) return this.forms;
    const { point, reference } = this.trial;
    const roots = nodesOf(reference);
    const author = new FormEvaluation(point, roots);
    this.forms = [author];
    const normal = author.hasFunctions ? this.normalRoots(roots) : null;
    if (normal) this.forms.push(new FormEvaluation(point, normal));
    return this.forms;
  }

  /** The normal form's nodes, or null where they are the author's. */
  private normalRoots(roots: readonly Node[]): Node[] | null {
    const { g } = this.trial.context.environment;
    try {
      const normal = roots.map((node) => {
        const form = normalForm(g, node);
        return form ? fromPolynomial(g, form) : node;
      });
      return normal.some((node, k) => node !== roots[k]) ? normal : null;
    } catch (error) {
      if (error instanceof TooLarge) return null;
      throw error;
    }
  }
}

/** A changed reference may be defined nowhere or beyond what is worked out: then the slip does not fit. */
export function quietly(test: () => boolean): boolean {
  try {
    return test();
  } catch (error) {
    if (failureOf(error).type === 'budget') throw error;
    return false;
  }
}
