import { type Node } from '../algebra/graph';
import { fromPolynomial, normalForm } from '../algebra/normal-form';
import { TooLarge } from '../algebra/polynomial';
import { multiply } from '../algebra/scalars';
import { type AnswerValue, answerValue } from '../kinds/answer-value';
import { nodesOf } from '../kinds/compare';
import { failureOf } from '../kinds/prepare';
import { featuresOf, type Features } from './features';
import { type FormChange, type Place, rebuildChanged } from './form-change';
import { FormEvaluation } from './form-evaluation';
import { comparable, looksEqual, type NodeValues, type Values, valuesOf } from './numeric-match';
import { Ratios } from './ratios';
import { type Factor, mapAllNodes, mapNodes, type Slip, type Trial, type TreeSlip } from './slip';

/** A change of form at one place, and the factors by which its value differs from the answer at the trial's point. */
export interface ChangedForm {
  readonly shape: FormEvaluation;
  readonly change: FormChange;
  readonly place: Place;
  readonly ratios: Ratios;
}

const ONE = { re: 1, im: 0 };

/** What the tries of one search share. Every change is looked at in doubles at one point before it is built and proved. */
export class SlipSearch {
  readonly answer: Values;
  readonly ratios: Ratios;
  /** Value of ħ at the trial's point. */
  readonly hbar: number;
  private features: Features | null = null;
  private forms: FormEvaluation[] | null = null;
  private readonly trees = new Map<TreeSlip, readonly { value: AnswerValue; ratios: Ratios }[]>();
  private readonly changed = new Map<FormChange, readonly ChangedForm[]>();

  constructor(readonly trial: Trial) {
    const { point, reference, answer } = trial;
    const wanted = nodesOf(reference);
    const given = nodesOf(answer);
    point.evaluate(Math.max(...wanted, ...given));
    const { kind } = reference;
    this.answer = comparable(kind, valuesOf(point, given));
    this.hbar = point.re[trial.context.environment.hbar]!;
    this.ratios = this.ratiosBetween(comparable(kind, valuesOf(point, wanted)));
  }

  fits(slip: Slip): boolean {
    const { trial } = this;
    switch (slip.type) {
      case 'ratio':
        return this.ratioFits(slip.factors) && slip.applies?.(trial) !== false;
      case 'value':
        return slip.change(trial.reference, trial).some((changed) => this.agrees(changed));
      case 'test':
        return slip.fits(trial);
      case 'tree':
        return this.changedTrees(slip).some(
          ({ value, ratios }) => ratios.mayBe(ONE) && trial.compare(value, trial.answer),
        );
      case 'form':
        return this.changedForms(slip.change).some(
          (form) => form.ratios.mayBe(ONE) && trial.compare(this.build(form), trial.answer),
        );
    }
  }

  /** Whether the answer is a factor times a value: seen at the point, then proved. */
  isFactor(value: AnswerValue, factor: Factor): boolean {
    const { g, hbar } = this.trial.context.environment;
    const node = factor.node(g, hbar);
    const scaled = mapNodes(value, (x) => multiply(g, node, x));
    return this.trial.compare(scaled, this.trial.answer);
  }

  ratiosOf(value: AnswerValue): Ratios {
    const { point } = this.trial;
    const nodes = nodesOf(value);
    point.evaluate(Math.max(...nodes));
    return this.ratiosBetween(this.seen(point, nodes));
  }

  /** The author's tree with a slip's change made, where it has a value. */
  changedTrees(slip: TreeSlip): readonly { readonly value: AnswerValue; readonly ratios: Ratios }[] {
    const known = this.trees.get(slip);
    if (known) return known;
    const { context, request, referenceTree } = this.trial;
    this.features ??= featuresOf(referenceTree);
    const found: { value: AnswerValue; ratios: Ratios }[] = [];
    for (const tree of this.features[slip.needs] ? slip.change(referenceTree) : []) {
      quietly(() => {
        const value = answerValue(context.environment, request.kind, tree);
        const ratios = this.ratiosOf(value);
        return ratios.isConstant && found.push({ value, ratios }) > 0;
      });
    }
    this.trees.set(slip, found);
    return found;
  }

  /** Every place of a change on the author's form and on the normal form where it moves the value. */
  changedForms(change: FormChange): readonly ChangedForm[] {
    const known = this.changed.get(change);
    if (known) return known;
    const found: ChangedForm[] = [];
    for (const shape of this.shapes()) {
      for (const place of shape.places(change)) {
        shape.evaluate(change, place);
        const ratios = this.ratiosBetween(this.seen(shape, shape.roots));
        if (ratios.isConstant) found.push({ shape, change, place, ratios });
      }
    }
    this.changed.set(change, found);
    return found;
  }

  /** Builds a changed form exactly. */
  build({ shape, change, place }: ChangedForm): AnswerValue {
    const built = rebuildChanged(this.trial.context.environment.g, shape.roots, change, place);
    let k = 0;
    const next = (): Node => {
      const root = shape.roots[k++]!;
      return built.get(root) ?? root;
    };
    return mapAllNodes(this.trial.reference, next);
  }

  private seen(at: NodeValues, nodes: readonly Node[]): Values {
    return comparable(this.trial.reference.kind, valuesOf(at, nodes));
  }

  private ratiosBetween(values: Values): Ratios {
    return new Ratios(this.trial.reference.kind, this.trial.context.options, values, this.answer);
  }

  private ratioFits(factors: readonly Factor[]): boolean {
    for (const factor of factors) {
      if (this.ratios.mayBe(factor.value(this.hbar)) && this.isFactor(this.trial.reference, factor)) return true;
    }
    return false;
  }

  private agrees(changed: AnswerValue): boolean {
    const { point, answer, compare, reference, context } = this.trial;
    const nodes = nodesOf(changed);
    point.evaluate(Math.max(...nodes));
    return (
      looksEqual(reference.kind, context.options, this.seen(point, nodes), this.answer) && compare(changed, answer)
    );
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
