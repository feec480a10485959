import { type Node } from '../algebra/graph';
import { fromPolynomial, normalForm } from '../algebra/normal-form';
import { TooLarge } from '../algebra/polynomial';
import { multiply } from '../algebra/scalars';
import { type AnswerValue, answerValue } from '../kinds/answer-value';
import { nodesOf } from '../kinds/compare';
import { failureOf } from '../kinds/prepare';
import { parse } from '../notation/parse';
import { catalogue } from './catalogue';
import { rebuild, type FormChange } from './form-change';
import { FormEvaluation } from './form-evaluation';
import { looksEqual, type Values, valuesOf } from './numeric-match';
import { pairsOfSlips } from './pairs';
import { Ratios } from './ratios';
import { mapAllNodes, mapNodes, type RatioSlip, type Slip, type Trial } from './slip';

/**
 * Ids of every slip that fits: the author's own first, then the catalogue's in its order, then pairs of slips neither of
 * which fits alone. A slip fits where the changed reference agrees with the answer, exactly (the unchanged one is known to differ).
 * Every change is looked at in doubles at one point before anything is built and proved.
 */
export function findSlips(trial: Trial): string[] {
  const search = new SlipSearch(trial);
  const found = search.authorSlips();
  for (const slip of catalogue) {
    if (!found.includes(slip.id) && quietly(() => search.fits(slip))) found.push(slip.id);
  }
  return [...found, ...pairsOfSlips(trial, search, found)];
}

/** What the tries of one search share. */
export class SlipSearch {
  readonly answer: Values;
  readonly reference: Values;
  readonly ratios: Ratios;
  private shapes: FormEvaluation[] | null = null;

  constructor(readonly trial: Trial) {
    const { point, reference, answer } = trial;
    const wanted = nodesOf(reference);
    const given = nodesOf(answer);
    point.evaluate(Math.max(...wanted, ...given));
    this.reference = valuesOf(point, wanted);
    this.answer = valuesOf(point, given);
    this.ratios = new Ratios(trial, this.reference, this.answer);
  }

  authorSlips(): string[] {
    const { request, context, answer, compare } = this.trial;
    const { symbols = {}, options } = request;
    const found: string[] = [];
    for (const { id, expression } of options?.slips ?? []) {
      const { tree } = parse(expression, { kind: request.kind, symbols, options, allowReferenceFunctions: true });
      const agrees = (): boolean =>
        tree !== null && compare(answerValue(context.environment, request.kind, tree), answer);
      if (quietly(agrees)) found.push(id);
    }
    return found;
  }

  fits(slip: Slip): boolean {
    const { trial } = this;
    switch (slip.type) {
      case 'ratio':
        return this.ratioFits(slip);
      case 'value':
        return slip.change(trial.reference, trial).some((changed) => this.agrees(changed));
      case 'test':
        return slip.fits(trial);
      case 'tree':
        return slip
          .change(trial.referenceTree)
          .some((tree) => quietly(() => this.agrees(answerValue(trial.context.environment, trial.request.kind, tree))));
      case 'form':
        return this.changedForms(slip.change, (values) => this.looksRight(values)).some((value) =>
          trial.compare(value, trial.answer),
        );
    }
  }

  private ratioFits(slip: RatioSlip): boolean {
    const { context, reference, answer, compare } = this.trial;
    const { g, hbar } = context.environment;
    return slip.factors(g, hbar).some(
      (factor) =>
        this.ratios.mayBe(factor) &&
        (slip.applies?.(this.trial) ?? true) &&
        compare(
          mapNodes(reference, (node) => multiply(g, factor, node)),
          answer,
        ),
    );
  }

  looksRight(values: Values): boolean {
    return looksEqual(this.trial.reference.kind, this.trial.context.options, values, this.answer);
  }

  /** Seen at the point, then proved. */
  private agrees(changed: AnswerValue): boolean {
    const { point, answer, compare } = this.trial;
    const nodes = nodesOf(changed);
    point.evaluate(Math.max(...nodes));
    return this.looksRight(valuesOf(point, nodes)) && compare(changed, answer);
  }

  /** The references with a change of form that pass a test of their values: author's form, then normal form. */
  changedForms(change: FormChange, passes: (values: Values) => boolean): AnswerValue[] {
    const { g } = this.trial.context.environment;
    const passed: AnswerValue[] = [];
    for (const shape of this.forms()) {
      for (const place of shape.places(change)) {
        shape.evaluate(change, place);
        if (!passes(valuesOf(shape, shape.roots))) continue;
        const built = rebuild(g, shape.roots, change, place);
        let k = 0;
        const next = (): Node => {
          const root = shape.roots[k++]!;
          return built.get(root) ?? root;
        };
        passed.push(mapAllNodes(this.trial.reference, next));
      }
    }
    return passed;
  }

  private forms(): FormEvaluation[] {
    if (this.shapes) return this.shapes;
    const { point, reference } = this.trial;
    const roots = nodesOf(reference);
    this.shapes = [new FormEvaluation(point, roots)];
    const normal = this.normalRoots(roots);
    if (normal) this.shapes.push(new FormEvaluation(point, normal));
    return this.shapes;
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
function quietly(test: () => boolean): boolean {
  try {
    return test();
  } catch (error) {
    if (failureOf(error).type === 'budget') throw error;
    return false;
  }
}
