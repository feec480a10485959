/** Whole answers: what each kind reads to, the conditions of templates, and what reading depends on. */
import { type AnswerKind, type SymbolTable } from '../contract';
import { type Diagnostic, type Span } from '../diagnostics';
import { type Expression } from './tree';

export type { AnswerKind };

/** Declared names and their domains. The keys are the canonical names that symbol nodes carry. */
export type Symbols = SymbolTable;

/** A label such as `E_+` or `λ_{1,2}`; it is shown back and otherwise ignored. */
export interface Label {
  readonly base: string;
  readonly index: string | null;
}

export interface LabelledValue {
  readonly span: Span;
  readonly label: Label | null;
  /** Scalar; a value with ± or ∓ stands for two. */
  readonly value: Expression;
}

/** The answer of kind `eigenvalues`: one or two values once every ± is counted as two. */
export interface ValuesNode {
  readonly node: 'values';
  readonly span: Span;
  readonly bracket: '{' | '(' | '[' | 'none';
  readonly entries: readonly LabelledValue[];
}

export interface PairEntry {
  readonly span: Span;
  readonly value: LabelledValue;
  /** Of type ket. */
  readonly state: Expression;
}

/** The answer of kind `eigenpairs`: two pairs, or one that holds a ± or ∓ and stands for two. */
export interface PairsNode {
  readonly node: 'pairs';
  readonly span: Span;
  readonly pairs: readonly PairEntry[];
}

/** One unit with its SI prefix and integer power; after a slash the power is already negative. */
export interface UnitFactor {
  readonly span: Span;
  /** SI prefix symbol, `u` for micro, empty for none. */
  readonly prefix: string;
  /** Canonical ASCII symbol from notation/units (`Hz`, `eV`, `ohm`, `deg`). */
  readonly unit: string;
  readonly power: number;
}

/** The answer of kind `quantity`: a numeric constant and a recognised unit (null where none was written). */
export interface QuantityNode {
  readonly node: 'quantity';
  readonly span: Span;
  /** Scalar, without symbols, ħ, h or i. */
  readonly value: Expression;
  readonly unit: readonly UnitFactor[] | null;
}

/** The answer of kind `choice`: the matching entry of `options.choices`, exactly as it stands there. */
export interface ChoiceNode {
  readonly node: 'choice';
  readonly span: Span;
  readonly choice: string;
}

/**
 * What was read for a kind.
 * scalar: Expression of type scalar. operator: operator or scalar. pauli: list of four, operator or scalar.
 * vector: list of three. state: ket. eigenvalues: ValuesNode, or an Expression of type list (a reference function, or
 * a multiplied list). eigenpairs: PairsNode, or an Expression of type pairs. quantity: QuantityNode. choice: ChoiceNode.
 */
export type AnswerTree = Expression | ValuesNode | PairsNode | QuantityNode | ChoiceNode;

export type Relation = '=' | '!=' | '<' | '<=' | '>' | '>=';

/** A condition of a template. A comparison is a chain: `0 < a < b` holds where every link holds. */
export type Condition =
  | {
      readonly node: 'comparison';
      readonly span: Span;
      readonly operands: readonly Expression[];
      /** One fewer than operands. */
      readonly relations: readonly Relation[];
    }
  | { readonly node: 'and' | 'or'; readonly span: Span; readonly parts: readonly Condition[] }
  | { readonly node: 'not'; readonly span: Span; readonly body: Condition };

/** What reading depends on besides the text. */
export interface ReadingContext {
  readonly kind: AnswerKind;
  readonly symbols: Symbols;
  readonly options?: {
    /** Kind `choice`: the labels. */
    readonly choices?: readonly string[];
    /** Names defined by expressions; they are read like declared symbols. */
    readonly definitions?: Readonly<Record<string, string>>;
  };
  /** Whether the reference functions may be used (references of templates, never answers). */
  readonly allowReferenceFunctions?: boolean;
}

/** The result of `parse`: a tree unless unreadable, and what there is to say. */
export interface ParseResult {
  /** Null exactly when a diagnostic other than `ambiguous` is present. */
  readonly tree: AnswerTree | null;
  readonly diagnostics: readonly Diagnostic[];
  /** Whether people commonly read this text in another way too. */
  readonly ambiguous: boolean;
  /**
   * The other common readings, structurally different from `tree` and from each other; empty unless ambiguous, at most
   * fifteen.
   */
  readonly alternatives: readonly AnswerTree[];
}
