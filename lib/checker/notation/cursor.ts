/** The state of a parse: a place among tokens, the first problem, and which of two common readings to take. */
import { type Diagnostic, type DiagnosticCode, type Span } from '../diagnostics';
import { maximumDepth, maximumNodes } from './limits';
import { type Scope } from './scope';
import { makeToken, type Token, type TokenKind } from './token';
import { type Expression, type NumberNode, type ReferenceName, type ValueType } from './tree';
import { isRefusal, type Typed } from './typing';

/** Places where people write one thing and mean another; each is one bit. */
export const choices = {
  /** What an unwritten product after `/` divides by. */
  slash: 1,
  /** A bare function takes less than the rule gives it. */
  shortExtent: 2,
  /** A bare function takes a quotient that the rule leaves outside. */
  longExtent: 4,
  /** An unbraced exponent takes more than one atom. */
  exponent: 8,
  /** A run of letters splits in another way, or `2e-3` is a product. */
  split: 16,
  /** An unbraced exponent of e that goes on also takes operators: `e^-iθσ_x/2`. */
  operatorExponent: 32,
} as const;

/** The mutually recursive rules, so that each can live in its own file. */
export interface Grammar {
  readonly sum: (cursor: Cursor) => Expression;
  readonly power: (cursor: Cursor) => Expression;
  readonly primary: (cursor: Cursor) => Expression;
  /** Null where reference functions are never read. */
  readonly reference: ((cursor: Cursor, token: Token, name: ReferenceName) => Expression) | null;
}

/** A reading remembered when a rule gives a factor back. */
interface Remembered {
  readonly expression: Expression;
  readonly next: number;
}

export class Cursor {
  at = 0;
  problem: Diagnostic | null = null;
  /** Choices that this text has met. */
  met = 0;
  /** Where the first of each choice was met. */
  places: Map<number, Span> | null = null;
  /** Whether ± may stand here, and whether it has. */
  plusMinus = false;
  plusMinusSeen = false;
  /** Whether `(a, b)` is a state here. */
  stateExpected = false;
  /** Where an identity operator was first read, for a hint. */
  identitySpan: Span | null = null;
  /** Token at which a bracket would be a row of a matrix. */
  rowAt = -1;
  private limit: number;
  private depth = 0;
  private nodes = 0;
  private readonly end: Token;
  private remembered: Map<number, Remembered> | null = null;

  constructor(
    readonly tokens: readonly Token[],
    readonly scope: Scope,
    readonly grammar: Grammar,
    /** Bits of `choices` for which the other reading is taken. */
    readonly taken: number,
  ) {
    this.limit = tokens.length - 1;
    this.end = tokens[tokens.length - 1] ?? makeToken('end', '', 0, 0, false);
  }

  /** The token here; at the limit, and after a problem, the end. */
  peek(): Token {
    return this.at < this.limit ? (this.tokens[this.at] ?? this.end) : this.end;
  }

  /** The token some places ahead. */
  ahead(distance: number): Token {
    return this.at + distance < this.limit ? (this.tokens[this.at + distance] ?? this.end) : this.end;
  }

  /** The token just passed. */
  previous(): Token {
    return this.tokens[this.at - 1] ?? this.end;
  }

  next(): Token {
    const token = this.peek();
    if (token !== this.end) this.at += 1;
    return token;
  }

  accept(kind: TokenKind): boolean {
    if (this.peek().kind !== kind) return false;
    this.at += 1;
    return true;
  }

  atEnd(): boolean {
    return this.at >= this.limit;
  }

  /** Reads up to a token as if the text ended there. */
  within<Result>(from: number, to: number, read: () => Result): Result {
    const outer = this.limit;
    if (this.problem === null) {
      this.at = from;
      this.limit = to;
    }
    const result = read();
    if (this.problem === null) this.limit = outer;
    return result;
  }

  /** Where the current limit is. */
  getLimit(): number {
    return this.limit;
  }

  /** Records the first problem; from then on only the end is seen, so that every loop ends. Returns a stand-in. */
  fail(code: DiagnosticCode, span: Span, message: string, hint?: string): NumberNode {
    if (this.problem === null) {
      this.problem = { code, span: { start: span.start, end: span.end }, message, hint };
      this.limit = -1;
    }
    return standIn;
  }

  /** The type, or a problem at the span. */
  typed(typed: Typed, span: Span): ValueType {
    if (!isRefusal(typed)) return typed;
    this.fail(typed.code, span, typed.message, typed.hint);
    return 'scalar';
  }

  /** Counts a new node. */
  node<Node extends Expression>(node: Node): Node {
    this.nodes += 1;
    if (this.nodes > maximumNodes) {
      this.fail('too-many-nodes', node.span, 'This answer is too long to be read.', 'Write it more shortly.');
    }
    return node;
  }

  /** Goes one level deeper; false, with a problem, where that is too deep. */
  enter(): boolean {
    this.depth += 1;
    if (this.depth <= maximumDepth) return true;
    const { start, end } = this.peek();
    this.fail('too-deep', { start, end }, `This is nested more than ${maximumDepth} deep.`);
    return false;
  }

  leave(): void {
    this.depth -= 1;
  }

  /** Notes that a choice has another common reading. */
  meet(choice: number, span: Span): void {
    this.met |= choice;
    this.places ??= new Map();
    if (!this.places.has(choice)) this.places.set(choice, { start: span.start, end: span.end });
  }

  takes(choice: number): boolean {
    return (this.taken & choice) !== 0;
  }

  /** Gives a factor back: the same reading is used when its place is met again. */
  giveBack(from: number, expression: Expression): void {
    if (this.problem !== null) return;
    this.remembered ??= new Map();
    this.remembered.set(from, { expression, next: this.at });
    this.at = from;
  }

  /** The factor given back at this place, which is then passed. */
  recall(): Expression | null {
    const remembered = this.remembered?.get(this.at);
    if (remembered === undefined || this.problem !== null || this.at >= this.limit) return null;
    this.at = remembered.next;
    return remembered.expression;
  }
}

const standIn: NumberNode = {
  node: 'number',
  type: 'scalar',
  span: { start: 0, end: 0 },
  numerator: 1n,
  denominator: 1n,
  mantissa: '1',
  exponent: 0,
  decimal: false,
  decimals: 0,
  significantFigures: 1,
  scientific: false,
};
