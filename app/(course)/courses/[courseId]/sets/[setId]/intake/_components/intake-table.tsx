'use client';

import { DataTable, type TableColumn } from '@/components/ui/data-table';
import { TimeStamp } from '@/components/ui/time-stamp';

/** An upload as the table of uploads shows it. */
export type IntakeTableLine = {
  id: string;
  href: string;
  fileName: string;
  words: string;
  rowsTotal: number;
  rowsAccepted: number;
  rowsRefused: number;
  rowsChecked: number;
  uploaderName: string;
  at: string;
};

const columns: TableColumn[] = [
  { key: 'file', label: 'File', heading: true },
  { key: 'state', label: 'State' },
  { key: 'rows', label: 'Rows', align: 'end' },
  { key: 'refused', label: 'Refused', align: 'end' },
  { key: 'checked', label: 'Checked', align: 'end' },
  { key: 'by', label: 'By' },
  { key: 'at', label: 'Uploaded' },
];

/** What was uploaded for a set before. */
export function IntakeTable({ lines, zone }: { lines: readonly IntakeTableLine[]; zone: string }) {
  return (
    <DataTable
      caption="Uploads"
      columns={columns}
      filterLabel={lines.length > 8 ? 'Filter' : null}
      empty="Nothing has been uploaded for this set yet."
      rows={lines.map((line) => ({
        id: line.id,
        cells: {
          file: { value: line.fileName, href: line.href },
          state: line.words,
          rows: line.rowsTotal,
          refused: line.rowsRefused === 0 ? null : line.rowsRefused,
          checked: line.rowsChecked,
          by: line.uploaderName,
          at: { value: line.at, node: <TimeStamp at={new Date(line.at)} zone={zone} /> },
        },
      }))}
    />
  );
}
