/** Counts of pairs of ratings: rows are the first rater's categories, columns the second's, in the same order. */
export type ContingencyTable = readonly (readonly number[])[];

/**
 * Counts pairs of ratings by category.
 *
 * @param pairs the two raters' ratings of each thing
 * @param categories every category, in order; a rating outside them is a RangeError
 */
export function contingencyTable<Category>(
  pairs: readonly (readonly [Category, Category])[],
  categories: readonly Category[],
): number[][] {
  const table = categories.map(() => categories.map(() => 0));
  for (const [first, second] of pairs) {
    const row = table[categories.indexOf(first)];
    const column = categories.indexOf(second);
    if (row === undefined || column < 0) throw new RangeError('A rating lies outside the categories.');
    row[column] = (row[column] ?? 0) + 1;
  }
  return table;
}

/** The shares of a table's cells, with those of its rows and columns; null for an empty table. */
export type Shares = { total: number; cells: number[][]; rows: number[]; columns: number[] };

/** Turns counts into shares. Throws a RangeError where the table is not square. */
export function sharesOf(table: ContingencyTable): Shares | null {
  if (table.some((row) => row.length !== table.length)) throw new RangeError('A table of agreement is square.');
  const total = table.flat().reduce((sum, count) => sum + count, 0);
  if (total === 0) return null;
  const cells = table.map((row) => row.map((count) => count / total));
  const rows = cells.map((row) => row.reduce((sum, share) => sum + share, 0));
  const columns = cells.map((_row, index) => cells.reduce((sum, row) => sum + (row[index] ?? 0), 0));
  return { total, cells, rows, columns };
}
