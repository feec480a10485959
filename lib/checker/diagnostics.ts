/**
 * Diagnostics of the reader: a closed set of codes, each with a place in the text and a sentence for a student.
 * This file imports nothing.
 */

/** A half-open range [start, end) counted in Unicode code points of the raw text. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

/**
 * Everything that reading can report. All but `ambiguous` make the text unreadable.
 *
 * - limits: `too-long`, `too-deep`, `too-many-nodes`, `number-too-large`
 * - characters and numbers: `empty`, `unknown-character`, `unknown-command`, `bad-number`, `decimal-comma`,
 *   `numbers-side-by-side`, `mixed-number`
 * - names: `undeclared-name`, `digits-after-name`, `prime`, `bad-index`, `reserved-name`, `bad-name`, `log-base`,
 *   `reference-function`
 * - structure: `missing-operand`, `unexpected`, `unclosed`, `unopened`, `bars`, `empty-brackets`, `missing-argument`,
 *   `argument-count`, `no-inverse-function`, `bad-argument`, `chain`, `left-side`, `plus-minus`, `ket-label`,
 *   `ket-unclosed`, `expectation-brackets`, `matrix-shape`, `entry-type`, `comparison`
 * - types: `two-kets`, `two-bras`, `product-type`, `sum-type`, `operator-function`, `operator-division`,
 *   `power-type`, `identity-in-scalar`
 * - the kind asked for: `wrong-kind`, `value-count`, `unit-unknown`, `unit-syntax`, `symbol-in-quantity`,
 *   `unknown-choice`
 * - defined nowhere: `division-by-zero`
 * - two common readings: `ambiguous`
 */
export const diagnosticCodes = [
  'ambiguous',
  'argument-count',
  'bad-argument',
  'bad-index',
  'bad-name',
  'bad-number',
  'bars',
  'chain',
  'comparison',
  'decimal-comma',
  'digits-after-name',
  'division-by-zero',
  'empty',
  'empty-brackets',
  'entry-type',
  'expectation-brackets',
  'identity-in-scalar',
  'ket-label',
  'ket-unclosed',
  'left-side',
  'log-base',
  'matrix-shape',
  'missing-argument',
  'missing-operand',
  'mixed-number',
  'no-inverse-function',
  'number-too-large',
  'numbers-side-by-side',
  'operator-division',
  'operator-function',
  'plus-minus',
  'power-type',
  'prime',
  'product-type',
  'reference-function',
  'reserved-name',
  'sum-type',
  'symbol-in-quantity',
  'too-deep',
  'too-long',
  'too-many-nodes',
  'two-bras',
  'two-kets',
  'unclosed',
  'undeclared-name',
  'unexpected',
  'unit-syntax',
  'unit-unknown',
  'unknown-character',
  'unknown-choice',
  'unknown-command',
  'unopened',
  'value-count',
  'wrong-kind',
] as const;

export type DiagnosticCode = (typeof diagnosticCodes)[number];

/** One thing to say about a text. `message` is a whole sentence; `hint` says what was probably meant. */
export interface Diagnostic {
  readonly code: DiagnosticCode;
  readonly span: Span;
  readonly message: string;
  readonly hint?: string;
}

/** Whether a diagnostic makes the text unreadable; `ambiguous` alone does not. */
export function isFatal(diagnostic: Diagnostic): boolean {
  return diagnostic.code !== 'ambiguous';
}
