import { DataTable } from '@/components/ui/data-table';
import { TimeStamp } from '@/components/ui/time-stamp';
import { type TroubledDelivery } from '@/lib/queries/mail-state';

/** Score reports whose mail needs a look; the course's own staff resend them. */
export function DeliveryTable({ deliveries }: { deliveries: readonly TroubledDelivery[] }) {
  const rows = deliveries.map((delivery) => ({
    id: delivery.id,
    cells: {
      set: `${delivery.courseCode}, set ${delivery.setNumber}`,
      state: delivery.state,
      error: delivery.lastError ?? '',
      at: { value: delivery.at.getTime(), node: <TimeStamp at={delivery.at} zone="UTC" style="short" /> },
    },
  }));
  return (
    <DataTable
      caption="Score reports that need a look"
      columns={columns}
      rows={rows}
      filterLabel={null}
      empty="No score report was refused or cut short."
    />
  );
}

const columns = [
  { key: 'set', label: 'Set', heading: true },
  { key: 'state', label: 'State' },
  { key: 'error', label: 'Last ended with' },
  { key: 'at', label: 'When' },
] as const;
