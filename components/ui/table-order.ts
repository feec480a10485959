/** What a cell shows and how it is put in order. A bare string or number shows itself. */
export interface TableCellParts<Node> {
  /** What is sorted by; null goes last in both directions. */
  readonly value: string | number | null;
  /** What the filter searches and what is shown when there is no `node`; `value` when left out. */
  readonly text?: string;
  /** What is shown instead, e.g. a verdict sign. */
  readonly node?: Node;
  /** Makes the cell a link. */
  readonly href?: string;
}

export type TableCellValue<Node> = string | number | null | TableCellParts<Node>;

export type Direction = 'ascending' | 'descending';

export interface TableOrder {
  readonly key: string;
  readonly direction: Direction;
}

const collator = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });

/** A cell's parts, whichever way it was given. */
export function cellParts<Node>(cell: TableCellValue<Node> | undefined): TableCellParts<Node> {
  if (cell === undefined || cell === null) return { value: null };
  return typeof cell === 'object' ? cell : { value: cell };
}

/** The words of a cell, for the filter and for showing. */
export function cellText<Node>(cell: TableCellValue<Node> | undefined): string {
  const { text, value } = cellParts(cell);
  return text ?? (value === null ? '' : String(value));
}

/**
 * Negative, zero or positive, as `first` stands before, with or behind `second`. Numbers by size, words as people order
 * them ("item 9" before "item 10"), empty cells last in both directions.
 */
export function compareCells<Node>(
  first: TableCellValue<Node> | undefined,
  second: TableCellValue<Node> | undefined,
  direction: Direction,
): number {
  const a = cellParts(first).value;
  const b = cellParts(second).value;
  if (a === null || b === null) return Number(a === null) - Number(b === null);
  const order = typeof a === 'number' && typeof b === 'number' ? a - b : collator.compare(String(a), String(b));
  return direction === 'ascending' ? order : -order;
}

interface Row<Node> {
  readonly cells: Readonly<Record<string, TableCellValue<Node>>>;
}

/** The rows that contain every word of the filter, in the order asked for; equal rows keep their place. */
export function arrangeRows<Node, R extends Row<Node>>(
  rows: readonly R[],
  filter: string,
  order: TableOrder | undefined,
): readonly R[] {
  const wanted = filter.toLowerCase().split(/\s+/).filter(Boolean);
  const kept = rows.filter((row) => {
    const words = Object.values(row.cells).map(cellText).join(' ').toLowerCase();
    return wanted.every((word) => words.includes(word));
  });
  if (!order) return kept;
  return [...kept].sort((a, b) => compareCells(a.cells[order.key], b.cells[order.key], order.direction));
}
