import { type AnswerValue } from '../kinds/answer-value';
import { type Context } from '../kinds/comparison';
import { type CheckRequest } from '../contract';
import { type NumericPoint } from '../equivalence/numeric';
import { type AnswerTree } from '../notation/answer-tree';

/** What a slip is tried on. */
export interface Trial {
  readonly request: CheckRequest;
  readonly context: Context;
  readonly referenceTree: AnswerTree;
  readonly reference: AnswerValue;
  readonly answerTree: AnswerTree;
  readonly answer: AnswerValue;
  /** Whether a changed reference agrees with the answer, under the options of the check. */
  readonly compare: (reference: AnswerValue, answer: AnswerValue) => boolean;
  /** The point at which reference and answer differ. */
  readonly point: NumericPoint | undefined;
}

/** A slip whose mistake is a change of the value. */
export interface ValueSlip {
  readonly type: 'value';
  readonly id: string;
  /** What happened, to stand after “differs from the reference:”. */
  readonly sentence: string;
  /** The changed references, most likely first; none where the slip does not fit the kind. */
  readonly change: (value: AnswerValue, trial: Trial) => readonly AnswerValue[];
}

/** A slip whose mistake is a change of the form: tried on the author's tree and on the normal form's. */
export interface FormSlip {
  readonly type: 'form';
  readonly id: string;
  readonly sentence: string;
  /** The changed trees, most likely first. */
  readonly change: (tree: AnswerTree) => readonly AnswerTree[];
}

/** A slip that is recognised by looking at the answer itself. */
export interface TestSlip {
  readonly type: 'test';
  readonly id: string;
  readonly sentence: string;
  readonly fits: (trial: Trial) => boolean;
}

export type Slip = ValueSlip | FormSlip | TestSlip;

/** A value with every scalar node changed alike; of eigenpairs, the values only. */
export function mapNodes(value: AnswerValue, change: (node: number) => number): AnswerValue {
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
