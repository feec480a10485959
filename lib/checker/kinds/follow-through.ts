import { Graph } from '../algebra/graph';
import { printText } from '../algebra/print-text';
import { type AnswerKind, type CheckOutcome, type CheckRequest } from '../contract';
import { decideEqual } from '../equivalence/decide';
import { seedOf } from '../equivalence/random';
import { type Pair } from '../equivalence/size-bound';
import { parse } from '../notation/parse';
import { type AnswerValue, answerValue } from './answer-value';
import { decide } from './check';
import { failureOf, isExpression, prepare } from './prepare';

/** A student's answer to an earlier part, by the name that stands for it in later references. */
export interface EarlierAnswer {
  readonly name: string;
  readonly kind: AnswerKind;
  readonly answer: string;
}

/** The check of a later part against what follows from the student's own earlier answers. */
export interface FollowThrough {
  readonly outcome: CheckOutcome;
  /** The reference with the student's answers in it, in the answer language; empty where one cannot be put in. */
  readonly reference: string;
  /** The recomputed reference is zero or a multiple of the identity: then no credit may be automatic. */
  readonly degenerate: boolean;
}

/**
 * Checks an answer against its reference with names replaced by the student's own earlier answers. A pure function of
 * its arguments; never throws. An earlier answer that cannot be read, or is no single expression, is an error.
 */
export function followThrough(request: CheckRequest, earlier: readonly EarlierAnswer[]): FollowThrough {
  const replaced = replaceNames(request, earlier);
  if ('error' in replaced) {
    return { outcome: { id: request.id, error: replaced.error }, reference: '', degenerate: false };
  }
  const own = { ...request, reference: replaced.reference };
  const outcome = decide(own);
  const decided = !('error' in outcome);
  return { outcome, reference: own.reference, degenerate: decided && isDegenerate(own) };
}

function replaceNames(
  request: CheckRequest,
  earlier: readonly EarlierAnswer[],
): { readonly reference: string } | { readonly error: string } {
  const texts = new Map<string, string>();
  for (const { name, kind, answer } of earlier) {
    const { tree } = parse(answer, { kind, symbols: request.symbols ?? {}, options: request.options });
    if (!tree || !isExpression(tree))
      return { error: `The earlier answer “${name}” cannot be put into the reference.` };
    texts.set(name, `(${printText(tree)})`);
  }
  const reference = request.reference.replace(
    /\\?[A-Za-z][A-Za-z0-9]*(?:_[A-Za-z0-9]+)*/g,
    (word) => texts.get(word) ?? word,
  );
  return { reference };
}

function isDegenerate(request: CheckRequest): boolean {
  const { kind, reference, symbols, options } = request;
  const { tree } = parse(reference, { kind, symbols: symbols ?? {}, options, allowReferenceFunctions: true });
  if (!tree || kind === 'choice' || kind === 'quantity') return false;
  const seed = seedOf(kind, reference);
  const context = prepare(symbols, options, seed);
  try {
    const pairs = pairsOfDegeneracy(answerValue(context.environment, kind, tree), context.environment.g.zero);
    return decideEqual(context.environment.g, pairs, context.points, seed).status === 'equal';
  } catch (error) {
    failureOf(error);
    return false;
  } finally {
    Graph.release(context.environment.g);
  }
}

/** What is equal where a value is zero, a multiple of the identity, or two equal eigenvalues. */
function pairsOfDegeneracy(value: AnswerValue, zero: number): Pair[] {
  switch (value.kind) {
    case 'scalar':
      return [[value.node, zero]];
    case 'operator':
    case 'pauli':
      return [
        [value.matrix[1], zero],
        [value.matrix[2], zero],
        [value.matrix[0], value.matrix[3]],
      ];
    case 'state':
    case 'vector':
      return value.components.map((node) => [node, zero]);
    case 'eigenvalues':
      return [[value.values[0] ?? zero, value.values[1] ?? zero]];
    case 'eigenpairs':
      return [[value.pairs[0]?.value ?? zero, value.pairs[1]?.value ?? zero]];
  }
}
