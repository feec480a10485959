/** The 97.5 % quantile of the standard normal distribution, for two-sided 95 % intervals (common practice). */
export const Z_95 = 1.959963984540054;

/** A two-sided interval. */
export type Interval = { lower: number; upper: number };
