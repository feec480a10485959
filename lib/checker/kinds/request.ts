import { type AnswerKind, type CheckRequest, type SymbolDomain } from '../contract';

/**
 * Checks that a value is a request of the contract. Written out by hand: it runs before every check, of which there are
 * tens of thousands a second. Unknown fields and options are refused, so that a misspelt option is not ignored.
 */
export function validateRequest(value: unknown): { readonly request: CheckRequest } | { readonly error: string } {
  if (!isRecord(value)) return { error: 'A check is a JSON object.' };
  for (const key of Object.keys(value)) {
    if (!requestFields.has(key)) return { error: `“${key}” is not a field of a check.` };
  }
  const { id, kind, reference, answer, symbols, options } = value;
  if (typeof id !== 'string' || id.length > 200) return { error: '“id” must be a string of at most 200 characters.' };
  if (typeof kind !== 'string' || !answerKinds.has(kind))
    return { error: '“kind” must be one of the kinds of answer.' };
  if (typeof reference !== 'string') return { error: '“reference” must be a string.' };
  if (typeof answer !== 'string') return { error: '“answer” must be a string.' };
  const problem = symbolsProblem(symbols) ?? optionsProblem(options, kind as AnswerKind);
  if (problem !== null) return { error: problem };
  return { request: value as unknown as CheckRequest };
}

const requestFields: ReadonlySet<string> = new Set(['id', 'kind', 'reference', 'answer', 'symbols', 'options']);

export const answerKinds: ReadonlySet<string> = new Set<AnswerKind>([
  'scalar',
  'quantity',
  'operator',
  'pauli',
  'eigenvalues',
  'state',
  'eigenpairs',
  'vector',
  'choice',
]);

const domains: ReadonlySet<unknown> = new Set<SymbolDomain>([
  'real',
  'positive',
  'nonnegative',
  'nonzero',
  'integer',
  'complex',
]);

type OptionTest = (value: unknown) => boolean;
const isBoolean: OptionTest = (value) => typeof value === 'boolean';
const isStrings: OptionTest = (value) => Array.isArray(value) && value.every((item) => typeof item === 'string');
const isNumberAbove =
  (least: number): OptionTest =>
  (value) =>
    typeof value === 'number' && Number.isFinite(value) && value >= least;

const optionTests: Readonly<Record<string, OptionTest>> = {
  upToPhase: isBoolean,
  upToScale: isBoolean,
  requireNormalised: isBoolean,
  reportHermitian: isBoolean,
  reportUnitary: isBoolean,
  answerForm: (value) => value === 'any' || value === 'evaluated',
  choices: isStrings,
  tolerance: isTolerance,
  definitions: (value) => isRecord(value) && Object.values(value).every((item) => typeof item === 'string'),
  assume: isStrings,
  slips: (value) => Array.isArray(value) && value.every(isAuthorSlip),
  budgetSteps: isNumberAbove(1),
};

function isAuthorSlip(value: unknown): boolean {
  return isRecord(value) && typeof value['id'] === 'string' && typeof value['expression'] === 'string';
}

function isTolerance(value: unknown): boolean {
  if (!isRecord(value)) return false;
  const keys = Object.keys(value);
  const [key] = keys;
  if (keys.length !== 1 || key === undefined) return false;
  const size = value[key];
  if (key === 'significantFigures') return Number.isInteger(size) && (size as number) >= 1 && (size as number) <= 15;
  return (key === 'relative' || key === 'absolute') && isNumberAbove(0)(size);
}

function symbolsProblem(symbols: unknown): string | null {
  if (symbols === undefined) return null;
  if (!isRecord(symbols)) return '“symbols” must be an object of names and domains.';
  for (const name of Object.keys(symbols)) {
    const domain = symbols[name];
    if (domains.has(domain)) continue;
    const ends = isRecord(domain) ? domain['between'] : undefined;
    if (!isStrings(ends) || (ends as string[]).length !== 2) return `The domain of “${name}” is not known.`;
  }
  return null;
}

function optionsProblem(options: unknown, kind: AnswerKind): string | null {
  if (options === undefined) return kind === 'choice' ? '“options.choices” is needed for a choice.' : null;
  if (!isRecord(options)) return '“options” must be an object.';
  for (const name of Object.keys(options)) {
    if (!Object.hasOwn(optionTests, name)) return `“${name}” is not an option.`;
    if (options[name] !== undefined && !optionTests[name]!(options[name]))
      return `The option “${name}” has a wrong value.`;
  }
  if (kind === 'choice' && !options['choices']) return '“options.choices” is needed for a choice.';
  return null;
}

export function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
