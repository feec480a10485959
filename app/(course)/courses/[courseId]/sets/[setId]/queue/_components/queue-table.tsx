'use client';

import { useMemo } from 'react';
import { DataTable, type TableColumn, type TableRow } from '@/components/ui/data-table';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { flagSentence, type FlagReason } from '@/lib/domain/flag-reasons';
import { type Verdict } from '@/lib/domain/verdict';

/** An answer of the queue as its table shows it. */
export type QueueLine = {
  id: string;
  href: string;
  kind: 'review' | 'appeal';
  state: 'waiting' | 'taken' | 'escalated';
  reasons: readonly FlagReason[];
  position: number;
  partKey: string;
  verdict: Verdict | null;
  slip: string | null;
  script: string;
  section: string | null;
  since: string;
  held: string;
  kin: number;
};

const columns: TableColumn[] = [
  { key: 'part', label: 'Part', heading: true },
  { key: 'script', label: 'Script' },
  { key: 'section', label: 'Section' },
  { key: 'verdict', label: 'Verdict' },
  { key: 'why', label: 'Why' },
  { key: 'kin', label: 'Kin', align: 'end' },
  { key: 'age', label: 'Age', align: 'end' },
  { key: 'state', label: 'State' },
];

/** What waits, as a dense table to sort and filter. */
export function QueueTable({ lines }: { lines: readonly QueueLine[] }) {
  const rows = useMemo(() => lines.map(rowOf), [lines]);
  return <DataTable caption="Waiting for a person" columns={columns} rows={rows} filterLabel="Filter" />;
}

function rowOf(line: QueueLine): TableRow {
  const part = `${line.position}${line.partKey}`;
  const why = line.kind === 'appeal' ? 'appeal' : line.reasons.map(reasonWord).join(', ');
  const state =
    line.state === 'taken' ? `held by ${line.held}` : line.state === 'escalated' ? 'asked the head TA' : 'waiting';
  return {
    id: line.id,
    cells: {
      part: { value: part, href: line.href },
      script: line.script,
      section: line.section ?? '–',
      verdict: line.verdict
        ? {
            value: `${line.verdict} ${line.slip ?? ''}`,
            node: <VerdictSign verdict={line.verdict} detail={line.slip ?? undefined} />,
          }
        : 'not checked yet',
      why: { value: why, node: <span title={line.reasons.map(flagSentence).join(' ')}>{why}</span> },
      kin: line.kin === 1 ? null : line.kin,
      age: { value: -Date.parse(line.since), text: ageOf(line.since) },
      state,
    },
  };
}

function reasonWord(reason: FlagReason): string {
  return reason.replaceAll('-', ' ');
}

/** How long ago, in the largest whole unit: "3 d", "5 h", "12 min". */
function ageOf(since: string): string {
  const minutes = Math.max(0, Math.floor((Date.now() - Date.parse(since)) / 60_000));
  if (minutes < 60) return `${minutes} min`;
  return minutes < 48 * 60 ? `${Math.floor(minutes / 60)} h` : `${Math.floor(minutes / 1440)} d`;
}
