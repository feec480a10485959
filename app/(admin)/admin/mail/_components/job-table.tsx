import { ActionButton } from '@/app/_components/action-button';
import { DataTable } from '@/components/ui/data-table';
import { TimeStamp } from '@/components/ui/time-stamp';
import { inWords } from '@/lib/presenters/audit-details';
import { type FailedJob } from '@/lib/queue/failed-jobs';
import { tryJobAgain } from '../actions';

/** Jobs that were set aside after their last try. */
export function JobTable({ jobs }: { jobs: readonly FailedJob[] }) {
  const rows = jobs.map((job) => ({
    id: job.id,
    cells: {
      name: inWords(job.name),
      attempts: job.attempts,
      error: job.lastError ?? '',
      at: { value: job.lastTriedAt.getTime(), node: <TimeStamp at={job.lastTriedAt} zone="UTC" style="short" /> },
      retry: {
        value: null,
        node: (
          <ActionButton
            action={tryJobAgain}
            fields={{ jobId: job.id }}
            label="Try again"
            look="plain"
            done="It is being tried again."
          />
        ),
      },
    },
  }));
  return (
    <DataTable
      caption="Failed jobs"
      columns={columns}
      rows={rows}
      filterLabel={null}
      empty="No job has failed for good."
    />
  );
}

const columns = [
  { key: 'name', label: 'Job', heading: true },
  { key: 'attempts', label: 'Tries', align: 'end' },
  { key: 'error', label: 'Last ended with' },
  { key: 'at', label: 'Last tried' },
  { key: 'retry', label: 'Mend', sortable: false },
] as const;
