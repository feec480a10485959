'use client';

import Link from 'next/link';
import { type KeyboardEvent, type ReactNode, useDeferredValue, useId, useMemo, useRef, useState } from 'react';
import { arrangeRows, cellParts, cellText, type TableCellValue, type TableOrder } from './table-order';

export type { TableOrder };
export type TableCell = TableCellValue<ReactNode>;

export interface TableColumn {
  readonly key: string;
  readonly label: string;
  /** Numbers stand at the end. */
  readonly align?: 'start' | 'end';
  /** Columns are sortable unless this is false. */
  readonly sortable?: boolean;
  /** The cell that names its row, read out as its heading. At most one. */
  readonly heading?: boolean;
}

export interface TableRow {
  readonly id: string;
  readonly cells: Readonly<Record<string, TableCell>>;
}

export interface DataTableProps {
  /** Says what the table holds; also names its scrolling region. */
  readonly caption: string;
  readonly columns: readonly TableColumn[];
  readonly rows: readonly TableRow[];
  readonly initialOrder?: TableOrder;
  /** The label of the filter box; null leaves the box out. */
  readonly filterLabel?: string | null;
  /** What stands in place of rows when there are none. */
  readonly empty?: ReactNode;
}

/**
 * A dense table of plain data: sortable heads, a filter, its own scrolling region. Arrow keys walk from row to row
 * along the links of the same column, Home and End to the first and last; `/` inside the table goes to the filter.
 */
export function DataTable({
  caption,
  columns,
  rows,
  initialOrder,
  filterLabel = 'Filter',
  empty = 'Nothing here yet.',
}: DataTableProps) {
  const id = useId();
  const filterBox = useRef<HTMLInputElement>(null);
  const [order, setOrder] = useState(initialOrder);
  const [filter, setFilter] = useState('');
  const searched = useDeferredValue(filter);
  const shown = useMemo(() => arrangeRows<ReactNode, TableRow>(rows, searched, order), [rows, searched, order]);

  const sortBy = (key: string) =>
    setOrder(
      order?.key === key && order.direction === 'ascending'
        ? { key, direction: 'descending' }
        : { key, direction: 'ascending' },
    );

  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (event.key === '/' && filterBox.current && event.target !== filterBox.current) {
      event.preventDefault();
      filterBox.current.focus();
    } else {
      walkRows(event);
    }
  };

  return (
    <div onKeyDown={onKeyDown}>
      <div className="mb-2 flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
        <p id={`${id}-caption`} className="text-small font-semibold">
          {caption}
          <span role="status" className="font-normal text-grey">
            {' · '}
            {shown.length === rows.length ? rows.length : `${shown.length} of ${rows.length}`}
          </span>
        </p>
        {filterLabel === null ? null : (
          <label className="no-print flex items-center gap-2 text-small text-grey">
            {filterLabel}
            <input
              ref={filterBox}
              type="search"
              value={filter}
              onChange={(event) => setFilter(event.target.value)}
              className="control min-h-9 w-48 py-1 text-small"
            />
          </label>
        )}
      </div>
      <div className="overflow-x-auto" role="region" aria-labelledby={`${id}-caption`} tabIndex={0}>
        <table className="data-table" aria-labelledby={`${id}-caption`}>
          <thead>
            <tr>
              {columns.map((column) => (
                <Head
                  key={column.key}
                  column={column}
                  direction={order?.key === column.key ? order.direction : undefined}
                  onSort={() => sortBy(column.key)}
                />
              ))}
            </tr>
          </thead>
          <tbody>
            {shown.map((row) => (
              <tr key={row.id}>
                {columns.map((column) => (
                  <Cell key={column.key} column={column} cell={row.cells[column.key]} />
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {shown.length === 0 ? (
        <div className="border-t border-hairline py-4 text-grey">
          {rows.length === 0 ? empty : `No row contains “${filter}”.`}
        </div>
      ) : null}
    </div>
  );
}

interface HeadProps {
  readonly column: TableColumn;
  readonly direction: TableOrder['direction'] | undefined;
  readonly onSort: () => void;
}

function Head({ column, direction, onSort }: HeadProps) {
  const align = column.align ?? 'start';
  if (column.sortable === false) {
    return (
      <th scope="col" data-align={align} className="font-semibold text-grey">
        {column.label}
      </th>
    );
  }
  return (
    <th scope="col" data-align={align} aria-sort={direction ?? 'none'} className="font-semibold text-grey">
      <button type="button" onClick={onSort} className="min-h-6 whitespace-nowrap hover:text-ink">
        {align === 'end' ? <SortArrow direction={direction} /> : null}
        {column.label}
        {align === 'end' ? null : <SortArrow direction={direction} />}
      </button>
    </th>
  );
}

/** An arrow beside the sorted column; the others keep the room, so that nothing moves on sorting. */
function SortArrow({ direction }: { direction: TableOrder['direction'] | undefined }) {
  return (
    <svg viewBox="0 0 10 10" aria-hidden="true" className="mx-1 inline-block h-2.5 w-2.5 fill-madder">
      {direction === 'ascending' ? <path d="M5 1 9 8H1z" /> : null}
      {direction === 'descending' ? <path d="M5 9 1 2h8z" /> : null}
    </svg>
  );
}

function Cell({ column, cell }: { column: TableColumn; cell: TableCell | undefined }) {
  const { node, href } = cellParts(cell);
  const words = node ?? cellText(cell);
  const content = href ? (
    <Link href={href} data-column={column.key} className="inline-block min-h-6">
      {words}
    </Link>
  ) : (
    words
  );
  const align = column.align ?? 'start';
  return column.heading ? (
    <th scope="row" data-align={align}>
      {content}
    </th>
  ) : (
    <td data-align={align}>{content}</td>
  );
}

/** Moves the focus along the links of one column. */
function walkRows(event: KeyboardEvent<HTMLElement>) {
  if (!(event.target instanceof HTMLElement) || event.altKey || event.ctrlKey || event.metaKey) return;
  const key = event.target.dataset.column;
  const body = event.target.closest('tbody');
  if (key === undefined || !body) return;
  const links = [...body.querySelectorAll<HTMLElement>('a[data-column]')].filter((link) => link.dataset.column === key);
  const here = links.indexOf(event.target);
  const last = links.length - 1;
  const next = { ArrowDown: Math.min(here + 1, last), ArrowUp: Math.max(here - 1, 0), Home: 0, End: last }[event.key];
  if (next === undefined) return;
  event.preventDefault();
  links[next]?.focus();
}
