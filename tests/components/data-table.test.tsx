// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { DataTable, type TableColumn, type TableRow } from '@/components/ui/data-table';
import { arrangeRows, compareCells } from '@/components/ui/table-order';

afterEach(cleanup);

const columns: TableColumn[] = [
  { key: 'script', label: 'Script', heading: true },
  { key: 'waits', label: 'Waits', align: 'end' },
  { key: 'note', label: 'Note', sortable: false },
];
const rows: TableRow[] = [
  { id: 'a', cells: { script: { value: 'K-10', href: '/a' }, waits: 5, note: 'spot check' } },
  { id: 'b', cells: { script: { value: 'K-9', href: '/b' }, waits: null, note: 'slip' } },
  { id: 'c', cells: { script: { value: 'K-100', href: '/c' }, waits: 12, note: 'slip' } },
];

const order = () => screen.getAllByRole('rowheader').map((cell) => cell.textContent);
const head = (name: string) => screen.getByRole('columnheader', { name });
const sortBy = (name: string) => fireEvent.click(within(head(name)).getByRole('button'));

describe('DataTable', () => {
  it('sorts words as people order them, numbers by size, and empty cells last in both directions', () => {
    render(<DataTable caption="Answers" columns={columns} rows={rows} />);
    expect(order()).toEqual(['K-10', 'K-9', 'K-100']);
    sortBy('Script');
    expect(order()).toEqual(['K-9', 'K-10', 'K-100']);
    expect(head('Script').getAttribute('aria-sort')).toBe('ascending');
    expect(head('Waits').getAttribute('aria-sort')).toBe('none');
    sortBy('Waits');
    expect(order()).toEqual(['K-10', 'K-100', 'K-9']);
    sortBy('Waits');
    expect(head('Waits').getAttribute('aria-sort')).toBe('descending');
    expect(order()).toEqual(['K-100', 'K-10', 'K-9']);
    expect(head('Note').hasAttribute('aria-sort')).toBe(false);
  });

  it('begins in the order asked for', () => {
    render(
      <DataTable
        caption="Answers"
        columns={columns}
        rows={rows}
        initialOrder={{ key: 'waits', direction: 'descending' }}
      />,
    );
    expect(order()).toEqual(['K-100', 'K-10', 'K-9']);
  });

  it('keeps the rows that contain every word of the filter, and says how many', () => {
    render(<DataTable caption="Answers" columns={columns} rows={rows} filterLabel="Find" />);
    const box = screen.getByRole('searchbox', { name: 'Find' });
    fireEvent.change(box, { target: { value: 'SLIP 100' } });
    expect(order()).toEqual(['K-100']);
    expect(screen.getByRole('status').textContent).toContain('1 of 3');
    fireEvent.change(box, { target: { value: 'nothing such' } });
    expect(screen.getByText('No row contains “nothing such”.')).toBeTruthy();
  });

  it('says what would be there when there is nothing', () => {
    render(<DataTable caption="Answers" columns={columns} rows={[]} empty="No answers wait." />);
    expect(screen.getByText('No answers wait.')).toBeTruthy();
  });

  it('is named by its caption, and so is its scrolling region, which the keyboard reaches', () => {
    render(<DataTable caption="Answers" columns={columns} rows={rows} />);
    expect(screen.getByRole('table', { name: /^Answers/ })).toBeTruthy();
    expect(screen.getByRole('region', { name: /^Answers/ }).tabIndex).toBe(0);
  });

  it('walks along the rows by keyboard and goes to the filter', () => {
    render(<DataTable caption="Answers" columns={columns} rows={rows} />);
    const link = (name: string) => screen.getByRole('link', { name });
    const press = (key: string) => fireEvent.keyDown(document.activeElement ?? document.body, { key });
    link('K-10').focus();
    press('ArrowDown');
    expect(document.activeElement).toBe(link('K-9'));
    press('End');
    expect(document.activeElement).toBe(link('K-100'));
    press('ArrowDown');
    expect(document.activeElement).toBe(link('K-100'));
    press('Home');
    press('ArrowUp');
    expect(document.activeElement).toBe(link('K-10'));
    press('/');
    expect(document.activeElement).toBe(screen.getByRole('searchbox'));
  });
});

describe('the order of a table', () => {
  it('is stable and leaves the given rows alone', () => {
    const same = [1, 2, 3].map((id) => ({ id, cells: { key: 'x' } }));
    expect(arrangeRows(same, '', { key: 'key', direction: 'descending' }).map((row) => row.id)).toEqual([1, 2, 3]);
    expect(arrangeRows(same, '', undefined)).toEqual(same);
  });

  it('compares a missing cell as an empty one', () => {
    expect(compareCells(undefined, 1, 'ascending')).toBe(1);
    expect(compareCells(1, null, 'descending')).toBe(-1);
    expect(compareCells(null, undefined, 'ascending')).toBe(0);
  });
});
