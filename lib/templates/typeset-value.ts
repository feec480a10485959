/** A drawn value as it is set into a formula. */
export interface TypesetValue {
  /** The whole value as TeX, with its sign. */
  readonly latex: string;
  /** Whether the value begins with a minus sign that can be merged with what stands before it. */
  readonly negative: boolean;
  /** The value as TeX without that sign. */
  readonly magnitude: string;
  /** Whether the magnitude is the number 1, which is not written before another factor. */
  readonly isOne: boolean;
  readonly isZero: boolean;
  /** Whether the value is a sum, which needs brackets beside another factor. */
  readonly isSum: boolean;
}

/** The value that belongs to a name; undefined where there is none. */
export type TypesetValues = (name: string) => TypesetValue | undefined;
