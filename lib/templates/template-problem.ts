/** A mistake in a template: where it stands in the draft (`parts.0.reference`), and what it is, in words. */
export interface TemplateProblem {
  /** Dotted path in the draft; empty for the template as a whole. */
  readonly path: string;
  readonly message: string;
  /** A mistake keeps a template from being published; advice does not. */
  readonly weight: 'mistake' | 'advice';
}
