/** Built-in words: constants, functions, operators, states, reference functions. Tables only. */
import {
  type ConstantName,
  type FunctionName,
  type OperatorIndex,
  type ReferenceName,
  type StateLabel,
  type WrittenLabel,
} from './tree';

/** What a word means. `wrapper` functions have nodes of their own. */
export type Meaning =
  | { readonly is: 'symbol'; readonly name: string }
  | { readonly is: 'constant'; readonly name: ConstantName }
  | { readonly is: 'function'; readonly name: FunctionName }
  | { readonly is: 'wrapper'; readonly name: 'sqrt' | 'abs' | 'conj' }
  | { readonly is: 'reference'; readonly name: ReferenceName }
  | { readonly is: 'operator'; readonly family: 'pauli' | 'spin'; readonly index: OperatorIndex }
  | { readonly is: 'identity'; readonly written: 'I' | 'one' | 'sigma' }
  | { readonly is: 'dagger' };

const functions: readonly FunctionName[] = [
  'sin',
  'cos',
  'tan',
  'sec',
  'csc',
  'cot',
  'sinh',
  'cosh',
  'tanh',
  'asin',
  'acos',
  'atan',
  'atan2',
  'asinh',
  'acosh',
  'atanh',
  'exp',
  'ln',
  'log',
  'Re',
  'Im',
];

/** Functions whose inverse `f^-1` has a name. */
export const inverseFunctions: ReadonlyMap<FunctionName, FunctionName> = new Map([
  ['sin', 'asin'],
  ['cos', 'acos'],
  ['tan', 'atan'],
  ['sinh', 'asinh'],
  ['cosh', 'acosh'],
  ['tanh', 'atanh'],
]);

const functionAliases: readonly (readonly [string, FunctionName])[] = [
  ['arcsin', 'asin'],
  ['arccos', 'acos'],
  ['arctan', 'atan'],
  ['arctan2', 'atan2'],
  ['arcsinh', 'asinh'],
  ['arccosh', 'acosh'],
  ['arctanh', 'atanh'],
  ['arsinh', 'asinh'],
  ['arcosh', 'acosh'],
  ['artanh', 'atanh'],
];

export const referenceNames: readonly ReferenceName[] = [
  'commutator',
  'anticommutator',
  'eigenvalues',
  'eigenpairs',
  'trace',
  'determinant',
  'adjoint',
  'pauli',
  'expectation',
  'variance',
  'uncertainty',
  'probability',
  'projector',
  'density',
  'bloch',
  'purity',
  'entropy',
  'spinor',
  'rotation',
  'propagator',
  'evolve',
  'heisenberg',
  'larmor',
  'rabi',
  'thermal',
];

const references = new Map<string, Meaning>(referenceNames.map((name) => [name, { is: 'reference', name }]));

/** The meaning of a reference function's name. */
export function referenceMeaning(word: string): Meaning | undefined {
  return references.get(word);
}

const operatorsByIndex = new Map<string, Meaning>();
for (const index of ['x', 'y', 'z', '+', '-'] as const) {
  operatorsByIndex.set(`S ${index}`, { is: 'operator', family: 'spin', index });
  operatorsByIndex.set(`σ ${index}`, { is: 'operator', family: 'pauli', index });
}
(['x', 'y', 'z'] as const).forEach((index, position) => {
  operatorsByIndex.set(`σ ${position + 1}`, { is: 'operator', family: 'pauli', index });
});
operatorsByIndex.set('σ 0', { is: 'identity', written: 'sigma' });

/** The operator that a base letter (`S` or `σ`) and an index name together. */
export function operatorMeaning(base: string, index: string): Meaning | undefined {
  return operatorsByIndex.get(`${base} ${index}`);
}

const words = new Map<string, Meaning>([
  ['i', { is: 'constant', name: 'i' }],
  ['pi', { is: 'constant', name: 'pi' }],
  ['π', { is: 'constant', name: 'pi' }],
  ['hbar', { is: 'constant', name: 'hbar' }],
  ['ħ', { is: 'constant', name: 'hbar' }],
  ['h', { is: 'constant', name: 'planck' }],
  ['e', { is: 'constant', name: 'euler' }],
  ['I', { is: 'identity', written: 'I' }],
  ['sqrt', { is: 'wrapper', name: 'sqrt' }],
  ['abs', { is: 'wrapper', name: 'abs' }],
  ['conj', { is: 'wrapper', name: 'conj' }],
  ['dagger', { is: 'dagger' }],
]);
for (const name of functions) words.set(name, { is: 'function', name });
for (const [alias, name] of functionAliases) words.set(alias, { is: 'function', name });
for (const index of ['x', 'y', 'z'] as const) {
  words.set(`S${index}`, { is: 'operator', family: 'spin', index });
  for (const base of ['σ', 'sigma']) words.set(`${base}${index}`, { is: 'operator', family: 'pauli', index });
}

/** Words without a subscript, by spelling. */
export const builtInWords: ReadonlyMap<string, Meaning> = words;

/** Built-in spellings by first letter, longest first, for splitting runs of letters. */
export const builtInByFirst: ReadonlyMap<string, readonly string[]> = (() => {
  const byFirst = new Map<string, string[]>();
  for (const word of words.keys()) {
    const first = word.charAt(0);
    const list = byFirst.get(first);
    if (list) list.push(word);
    else byFirst.set(first, [word]);
  }
  for (const list of byFirst.values()) list.sort((one, other) => other.length - one.length);
  return byFirst;
})();

/** Names that may be declared although they are built in: e is then a charge, h a symbol. */
export const declarableWords: ReadonlySet<string> = new Set(['e', 'h']);

/** Names that no symbol may have besides the built-in words. */
export const reservedWords: ReadonlySet<string> = new Set(['up', 'down', 'ket', 'bra', ...referenceNames]);

const labels = new Map<string, readonly [StateLabel, WrittenLabel]>([
  ['+', ['+z', '+']],
  ['-', ['-z', '-']],
  ['0', ['+z', '0']],
  ['1', ['-z', '1']],
  ['up', ['+z', 'up']],
  ['down', ['-z', 'down']],
  ['↑', ['+z', '↑']],
  ['↓', ['-z', '↓']],
]);
for (const label of ['+z', '-z', '+x', '-x', '+y', '-y'] as const) labels.set(label, [label, label]);

/** The state that a ket's or bra's label names, and how it was written. */
export const stateLabels: ReadonlyMap<string, readonly [StateLabel, WrittenLabel]> = labels;
