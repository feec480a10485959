import { Graph } from '../algebra/graph';
import { complexity } from '../algebra/to-tree';
import { printText } from '../algebra/print-text';
import { type AnswerKind, type CheckOptions, type Computed, type ComputeError, type SymbolTable } from '../contract';
import { type AnswerTree, type LabelledValue } from '../notation/answer-tree';
import { parse } from '../notation/parse';
import { printLatex } from '../notation/print-latex';
import { seedOf } from '../equivalence/random';
import { answerValue } from './answer-value';
import { normalTree } from './normal-tree';
import { BadRequest, failureOf, prepare } from './prepare';

/** A reference to be worked out. */
export interface ComputeRequest {
  readonly kind: AnswerKind;
  readonly reference: string;
  readonly symbols?: SymbolTable;
  readonly options?: CheckOptions;
}

/**
 * Works out a reference: every reference function, commutator and operator exponential evaluated, written in a normal
 * form of the answer language. Never throws.
 */
export function computeReference(request: ComputeRequest): Computed | ComputeError {
  const { kind, reference, symbols = {}, options } = request;
  const { tree, diagnostics } = parse(reference, { kind, symbols, options, allowReferenceFunctions: true });
  if (!tree) {
    const [problem] = diagnostics;
    const span = problem && ([problem.span.start, problem.span.end] as const);
    return { ok: false, error: problem?.message ?? 'The reference cannot be read.', span };
  }
  if (kind === 'choice' || kind === 'quantity') {
    return { ok: true, latex: printLatex(tree), text: reference.trim(), complexity: 1 };
  }
  try {
    const context = prepare(symbols, options, seedOf(kind, reference));
    try {
      const normal = normalTree(context, answerValue(context.environment, kind, tree));
      return { ok: true, latex: printLatex(normal), text: textOf(normal), complexity: complexityOf(normal) };
    } finally {
      Graph.release(context.environment.g);
    }
  } catch (error) {
    if (error instanceof BadRequest) return { ok: false, error: error.message };
    return { ok: false, error: `The reference has no value: ${failureOf(error).message}.` };
  }
}

function textOf(tree: AnswerTree): string {
  switch (tree.node) {
    case 'values':
      return `{${tree.entries.map(({ value }) => printText(value)).join(', ')}}`;
    case 'pairs':
      return tree.pairs.map(({ value, state }) => `${printText(value.value)}: ${printText(state)}`).join('; ');
    case 'quantity':
    case 'choice':
      return '';
    default:
      return printText(tree);
  }
}

function complexityOf(tree: AnswerTree): number {
  const ofValues = (values: readonly LabelledValue[]): number =>
    values.reduce((n, { value }) => n + complexity(value), 1);
  switch (tree.node) {
    case 'values':
      return ofValues(tree.entries);
    case 'pairs':
      return tree.pairs.reduce((n, { value, state }) => n + complexity(state) + ofValues([value]), 1);
    case 'quantity':
    case 'choice':
      return 1;
    default:
      return complexity(tree);
  }
}
