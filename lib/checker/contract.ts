/**
 * The check contract: the one JSON form that the web app, the bulk intake, the HTTP interface and the command line use.
 * Types only, so that any page may import them.
 */

/** The kinds of answer a part may ask for. */
export type AnswerKind =
  'scalar' | 'quantity' | 'operator' | 'pauli' | 'eigenvalues' | 'state' | 'eigenpairs' | 'vector' | 'choice';

/** The set a symbol's values are taken from; the ends of an interval are constant expressions in the answer language. */
export type SymbolDomain =
  | 'real'
  | 'positive'
  | 'nonnegative'
  | 'nonzero'
  | 'integer'
  | 'complex'
  | { readonly between: readonly [string, string] };

/** Declared symbols with their domains; `{"omega": "positive"}`. */
export type SymbolTable = Readonly<Record<string, SymbolDomain>>;

/** Exactly one of the three; `absolute` is in the reference's unit. */
export interface Tolerance {
  readonly relative?: number;
  readonly absolute?: number;
  readonly significantFigures?: number;
}

/** A wrong answer its author foresaw: an expression of the part's own kind in the answer language. */
export interface AuthorSlip {
  readonly id: string;
  readonly expression: string;
}

/** What a caller may ask of a check beside the two texts. Unknown names are refused. */
export interface CheckOptions {
  readonly upToPhase?: boolean;
  readonly upToScale?: boolean;
  readonly requireNormalised?: boolean;
  readonly reportHermitian?: boolean;
  readonly reportUnitary?: boolean;
  readonly answerForm?: 'any' | 'evaluated';
  readonly choices?: readonly string[];
  readonly tolerance?: Tolerance;
  readonly definitions?: Readonly<Record<string, string>>;
  readonly assume?: readonly string[];
  readonly slips?: readonly AuthorSlip[];
  readonly budgetSteps?: number;
}

/** One check. Both texts are in the answer language; the reference may use the reference functions. */
export interface CheckRequest {
  readonly id: string;
  readonly kind: AnswerKind;
  readonly reference: string;
  readonly answer: string;
  readonly symbols?: SymbolTable;
  readonly options?: CheckOptions;
}

export type Verdict = 'agrees' | 'differs' | 'undecided' | 'unreadable';

/** Values of the symbols at which two sides differ, and both sides there, as short decimal texts. */
export interface Witness {
  /** Value of each symbol, as text: `"0.73"`, `"0.4 - 1.2 i"`. */
  readonly values: Readonly<Record<string, string>>;
  /** Which part of the answer: `""` for a scalar, `"row 1, column 2"`, `"component 2"`, `"sum"` … */
  readonly element: string;
  readonly reference: string;
  readonly answer: string;
}

/** What decided a check; the table of its fields is in this folder's README. */
export interface Evidence {
  /** The test that decided: see the README's list. */
  readonly test: EvidenceTest;
  /** Largest probability that an exact test by modular signatures accepted two different functions. */
  readonly bound?: number;
  /** Number of prime fields used, degree bound and branch choices of the modular test. */
  readonly fields?: number;
  readonly degree?: number;
  readonly branches?: number;
  /** Number of points of the domain at which both sides were evaluated. */
  readonly points?: number;
  readonly witness?: Witness;
  /** Elements that differ: `[1, 2]` is row 1, column 2; `[2]` is component 2. Counted from 1. */
  readonly elements?: readonly (readonly number[])[];
  /** `not evaluated` where the answer left standing what it was asked to work out. */
  readonly form?: 'evaluated' | 'not evaluated';
  readonly hermitian?: Property;
  readonly unitary?: Property;
  /** Why it stayed undecided or is unreadable. */
  readonly reason?: string;
  /** Code of the diagnostic and the span of the answer it is about, in code points. */
  readonly code?: string;
  readonly span?: readonly [number, number];
  /** The tolerance that was applied, and how far apart the two were, relatively. */
  readonly tolerance?: Tolerance;
  readonly distance?: number;
}

export type Property = 'yes' | 'no' | 'undecided';

export type EvidenceTest =
  | 'normal form'
  | 'modular'
  | 'modular and numeric'
  | 'witness'
  | 'high-precision witness'
  | 'tolerance'
  | 'text'
  | 'dimension'
  | 'reading'
  | 'structure'
  | 'none';

/** The answer to one check. */
export interface CheckResponse {
  readonly id: string;
  readonly verdict: Verdict;
  readonly slip: string | null;
  readonly slips: readonly string[];
  readonly kinKey: string | null;
  /** The answer as it was read, as LaTeX; empty where nothing could be read. */
  readonly reading: string;
  readonly message: string;
  readonly evidence: Evidence;
  readonly ms: number;
}

/** A request that cannot be checked, whatever the answer. */
export interface CheckError {
  readonly id: string | null;
  readonly line?: number;
  readonly error: string;
}

export type CheckOutcome = CheckResponse | CheckError;

/** A reference worked out: what templates and the review desk show. */
export interface Computed {
  readonly ok: true;
  readonly latex: string;
  /** The same in the answer language, so that it can be checked against or shown in a text. */
  readonly text: string;
  /** Number of nodes of the printed form: a measure of how long it is. */
  readonly complexity: number;
}

export interface ComputeError {
  readonly ok: false;
  readonly error: string;
  readonly span?: readonly [number, number];
}
