'use client';

import { type ReactNode } from 'react';
import { ActionButton } from '@/app/_components/action-button';
import { DataTable, type TableRow } from '@/components/ui/data-table';
import { formatTime } from '@/components/ui/time-stamp';
import { deliveryWords, needsPerson } from '@/lib/presenters/delivery-words';
import { paths } from '@/lib/paths';
import { type DeliveryRow } from '@/lib/queries/deliveries';
import { sendAgain } from '../actions';

interface DeliveryTableProps {
  readonly courseId: string;
  readonly problemSetId: string;
  readonly zone: string;
  readonly rows: readonly DeliveryRow[];
}

/** The e-mail of each report; those that need a person first, each with the way to send it again. */
export function DeliveryTable({ rows, ...ids }: DeliveryTableProps) {
  return <DataTable caption="Deliveries" columns={columns} rows={rows.map((delivery) => row(delivery, ids))} />;
}

const columns = [
  { key: 'student', label: 'Student', heading: true },
  { key: 'email', label: 'To' },
  { key: 'report', label: 'Report' },
  { key: 'state', label: 'State' },
  { key: 'at', label: 'When' },
  { key: 'tries', label: 'Tries', align: 'end' },
  { key: 'again', label: 'Again', sortable: false },
] as const;

function row(delivery: DeliveryRow, { courseId, problemSetId, zone }: Omit<DeliveryTableProps, 'rows'>): TableRow {
  const { id, userId, student, email, revision, state, attempts, lastError } = delivery;
  // Over the wire a moment is a text.
  const at = new Date(delivery.at);
  const report = revision === 1 ? 'first' : `corrected, no. ${revision}`;
  return {
    id,
    cells: {
      student: {
        value: student,
        node: <OneLine>{student}</OneLine>,
        href: paths.reportOf(courseId, problemSetId, userId),
      },
      email,
      report: { value: revision, node: <OneLine>{report}</OneLine> },
      state: {
        value: deliveryWords[state],
        text: [deliveryWords[state], lastError].filter(Boolean).join(': '),
        node: <State delivery={delivery} />,
      },
      at: { value: at.getTime(), node: <OneLine>{formatTime(at, zone, 'short')}</OneLine> },
      tries: attempts,
      again: needsPerson(state)
        ? {
            value: null,
            node: (
              <OneLine>
                <Again ids={{ courseId, problemSetId, deliveryId: id }} delivery={delivery} />
              </OneLine>
            ),
          }
        : null,
    },
  };
}

function OneLine({ children }: { children: ReactNode }) {
  return <span className="whitespace-nowrap">{children}</span>;
}

function State({ delivery: { state, lastError } }: { delivery: DeliveryRow }) {
  return (
    <>
      <span className={needsPerson(state) ? 'font-semibold text-madder' : undefined}>{deliveryWords[state]}</span>
      {lastError && needsPerson(state) ? <span className="block min-w-48 text-grey">{lastError}</span> : null}
    </>
  );
}

function Again({ ids, delivery: { state, student, email } }: { ids: Record<string, string>; delivery: DeliveryRow }) {
  const words =
    state === 'unconfirmed'
      ? `The hand-over to the mail server was cut short: ${student} may have the report already. It goes out with the same Message-ID, by which a mail server can tell a repeat.`
      : `The report goes to ${email}. If the address is wrong, correct the account first.`;
  return (
    <ActionButton
      action={sendAgain}
      fields={ids}
      label="Send again"
      look="plain"
      done="It is on its way again."
      confirm={{ title: `Send the report to ${student} again?`, words }}
    />
  );
}
