import { assume } from '../algebra/assumptions';
import { Environment } from '../algebra/environment';
import { DefinedNowhere } from '../algebra/scalars';
import { Unsupported, ReferenceProblem, type Value } from '../algebra/value';
import { BudgetExceeded, DEFAULT_BUDGET } from '../algebra/graph';
import { type CheckOptions, type SymbolTable } from '../contract';
import { decideEqual } from '../equivalence/decide';
import { SamplePoints } from '../equivalence/sample-points';
import { type AnswerTree, type ReadingContext } from '../notation/answer-tree';
import { parse, parseCondition } from '../notation/parse';
import { type Expression } from '../notation/tree';
import { type Context } from './comparison';

/** Thrown where a request's declarations cannot be used; the message is for its author. */
export class BadRequest extends Error {}

const NO_SYMBOLS: SymbolTable = {};

/** The environment, sample points and options in which the values of one check are built and compared. */
export function prepare(
  symbols: SymbolTable = NO_SYMBOLS,
  options: CheckOptions = {},
  seed: number,
  values?: ReadonlyMap<string, Value>,
): Context {
  const reading: ReadingContext = { kind: 'scalar', symbols, options, allowReferenceFunctions: true };
  const definitions = new Map<string, Expression>();
  for (const [name, text] of Object.entries(options.definitions ?? {})) {
    definitions.set(name, readExpression(text, reading, `the definition of “${name}”`));
  }
  const environment = new Environment({
    symbols,
    definitions,
    values,
    interval: (name) => intervalTrees(symbols, name),
  });
  environment.g.stepsLeft = Math.min(options.budgetSteps ?? DEFAULT_BUDGET, DEFAULT_BUDGET);
  const points = new SamplePoints(environment.g, seed, environment.requirements);
  environment.equal = (x, y) => decideEqual(environment.g, [[x, y]], points, seed).status === 'equal';
  for (const text of options.assume ?? []) {
    const { tree, diagnostics } = parseCondition(text, {
      symbols: withDefinitions(symbols, options),
      allowReferenceFunctions: true,
    });
    if (!tree) throw new BadRequest(`The assumption “${text}” cannot be read: ${diagnostics[0]?.message ?? ''}`);
    assume(environment, tree);
  }
  return { environment, points, seed, options };
}

/** Conditions are read with defined names as symbols. */
function withDefinitions(symbols: SymbolTable, options: CheckOptions): SymbolTable {
  if (!options.definitions) return symbols;
  const names = Object.keys(options.definitions).filter((name) => !Object.hasOwn(symbols, name));
  return names.length === 0
    ? symbols
    : { ...symbols, ...Object.fromEntries(names.map((name) => [name, 'real' as const])) };
}

function intervalTrees(symbols: SymbolTable, name: string): readonly [Expression, Expression] | null {
  const domain = symbols[name];
  if (typeof domain !== 'object') return null;
  const reading: ReadingContext = { kind: 'scalar', symbols: NO_SYMBOLS };
  const [low, high] = domain.between.map((text) => readExpression(text, reading, `the interval of “${name}”`));
  return low && high ? [low, high] : null;
}

function readExpression(text: string, reading: ReadingContext, what: string): Expression {
  const { tree, diagnostics } = parse(text, reading);
  if (!tree || !isExpression(tree)) {
    throw new BadRequest(`${capital(what)} cannot be read: ${diagnostics[0]?.message ?? 'it is not an expression.'}`);
  }
  return tree;
}

export function isExpression(tree: AnswerTree): tree is Expression {
  return tree.node !== 'values' && tree.node !== 'pairs' && tree.node !== 'quantity' && tree.node !== 'choice';
}

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** What went wrong while a tree was turned into values. */
export type Failure =
  | { readonly type: 'nowhere'; readonly message: string }
  | { readonly type: 'unsupported' | 'reference' | 'budget'; readonly message: string };

/** Sorts the errors that building and comparing values may throw; any other is thrown on. */
export function failureOf(error: unknown): Failure {
  if (error instanceof DefinedNowhere) return { type: 'nowhere', message: error.message };
  if (error instanceof ReferenceProblem) return { type: 'reference', message: error.message };
  if (error instanceof BudgetExceeded) return { type: 'budget', message: 'the work limit of a check was reached' };
  if (error instanceof Unsupported) return { type: 'unsupported', message: error.message };
  if (error instanceof RangeError) return { type: 'budget', message: 'the expression is nested too deeply' };
  throw error;
}
