import { type Graph, type Node } from '../algebra/graph';
import { type Rational, toNumber } from '../algebra/rational';
import { type CheckRequest } from '../contract';
import { type NumericPoint } from '../equivalence/numeric';
import { type AnswerValue } from '../kinds/answer-value';
import { type Context } from '../kinds/comparison';
import { type AnswerTree } from '../notation/answer-tree';
import { type Features } from './features';
import { type FormChange } from './form-change';

/** What a slip is tried on. */
export interface Trial {
  readonly request: CheckRequest;
  readonly context: Context;
  readonly referenceTree: AnswerTree;
  readonly reference: AnswerValue;
  readonly answerTree: AnswerTree;
  readonly answer: AnswerValue;
  /** Whether a changed reference agrees with the answer, exactly and under the options of the check. */
  readonly compare: (reference: AnswerValue, answer: AnswerValue) => boolean;
  /** The point at which reference and answer are seen to differ; the changes are tried here before they are proved. */
  readonly point: NumericPoint;
}

interface Named {
  readonly id: string;
  /** What happened, to stand after “differs from the reference:”. */
  readonly sentence: string;
}

/** A constant factor between reference and answer: its value where ħ has a given one, and its node. */
export interface Factor {
  readonly value: (hbar: number) => Complex;
  readonly node: (g: Graph, hbar: Node) => Node;
}

export interface Complex {
  readonly re: number;
  readonly im: number;
}

/** A real rational factor. */
export const realFactor = (value: Rational): Factor => {
  const constant = { re: toNumber(value), im: 0 };
  return { value: () => constant, node: (g) => g.number(value) };
};

/** The answer is a constant times the reference. */
export interface RatioSlip extends Named {
  readonly type: 'ratio';
  readonly factors: readonly Factor[];
  /** Whether the slip makes sense for this reference; always where absent. */
  readonly applies?: (trial: Trial) => boolean;
}

/** Another change of the value. */
export interface ValueSlip extends Named {
  readonly type: 'value';
  /** The changed references, most likely first; none where the slip does not fit the kind. */
  readonly change: (value: AnswerValue, trial: Trial) => readonly AnswerValue[];
}

/** A change of the form: made on the author's form and on the normal form, everywhere or at one place. */
export interface FormSlip extends Named {
  readonly type: 'form';
  readonly change: FormChange;
}

/** A change of the form that needs the author's own tree, in which operators and functions are still to be seen. */
export interface TreeSlip extends Named {
  readonly type: 'tree';
  /** What the tree must hold for the slip to be tried. */
  readonly needs: keyof Features;
  readonly change: (tree: AnswerTree) => readonly AnswerTree[];
}

/** A slip that is recognised by looking at the answer itself. */
export interface TestSlip extends Named {
  readonly type: 'test';
  readonly fits: (trial: Trial) => boolean;
}

export type Slip = RatioSlip | ValueSlip | FormSlip | TreeSlip | TestSlip;

/** A value with every scalar node changed alike; of eigenpairs, the values only. */
export function mapNodes(value: AnswerValue, change: (node: Node) => Node): AnswerValue {
  switch (value.kind) {
    case 'scalar':
      return { ...value, node: change(value.node) };
    case 'operator':
    case 'pauli': {
      const [a, b, c, d] = value.matrix;
      return { kind: value.kind, matrix: [change(a), change(b), change(c), change(d)] };
    }
    case 'eigenvalues':
      return { kind: 'eigenvalues', values: value.values.map(change) };
    case 'state':
      return { kind: 'state', components: [change(value.components[0]), change(value.components[1])] };
    case 'vector':
      return { kind: 'vector', components: value.components.map(change) };
    case 'eigenpairs':
      return {
        kind: 'eigenpairs',
        pairs: value.pairs.map((pair) => ({ value: change(pair.value), state: pair.state })),
      };
  }
}

/** The same, with the components of states changed too. */
export function mapAllNodes(value: AnswerValue, change: (node: Node) => Node): AnswerValue {
  if (value.kind !== 'eigenpairs') return mapNodes(value, change);
  return {
    kind: 'eigenpairs',
    pairs: value.pairs.map((pair) => ({
      value: change(pair.value),
      state: [change(pair.state[0]), change(pair.state[1])],
    })),
  };
}
