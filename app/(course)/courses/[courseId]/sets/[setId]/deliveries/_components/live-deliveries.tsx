'use client';

import { useQuery } from '@tanstack/react-query';
import { Progress } from '@/components/ui/progress';
import { QueryProvider } from '@/components/ui/query-provider';
import { deliveryWords, isUnderWay } from '@/lib/presenters/delivery-words';
import { paths } from '@/lib/paths';
import { type DeliveryRow } from '@/lib/queries/deliveries';
import { DeliveryTable } from './delivery-table';

/** How often the page looks again while mail is under way, in milliseconds. */
const LOOK_AGAIN = 2000;

interface LiveDeliveriesProps {
  readonly courseId: string;
  readonly problemSetId: string;
  readonly zone: string;
  /** As the server saw them when it made the page. */
  readonly rows: readonly DeliveryRow[];
}

/** The deliveries of a set, looked at again by itself while any is under way. */
export function LiveDeliveries(props: LiveDeliveriesProps) {
  return (
    // What the server says anew begins a new cache: the old one would hide it.
    <QueryProvider key={props.rows.map(({ id, state }) => `${id}${state}`).join()}>
      <Live {...props} />
    </QueryProvider>
  );
}

function Live({ courseId, problemSetId, zone, rows }: LiveDeliveriesProps) {
  const { data, isError } = useQuery({
    queryKey: ['deliveries', problemSetId],
    queryFn: () => look(problemSetId),
    initialData: rows,
    enabled: (query) => query.state.data?.some(({ state }) => isUnderWay(state)) ?? false,
    refetchInterval: LOOK_AGAIN,
  });
  const underWay = data.filter(({ state }) => isUnderWay(state)).length;
  return (
    <>
      <div role="status" className="mb-4 max-w-measure">
        {underWay === 0 ? null : (
          <Progress
            label="Sending"
            value={data.length - underWay}
            max={data.length}
            detail={`${data.length - underWay} of ${data.length} settled`}
          />
        )}
        {isError ? (
          <p className="mt-1 text-small text-madder">
            Halfmark cannot be reached; this is how it was last. It is tried again by itself.
          </p>
        ) : null}
      </div>
      <p className="mb-4 font-semibold">{countsInWords(data)}</p>
      <DeliveryTable courseId={courseId} problemSetId={problemSetId} zone={zone} rows={data} />
    </>
  );
}

/** "58 sent, 1 failed": how many there are in each state. */
function countsInWords(rows: readonly DeliveryRow[]): string {
  const states = [...new Set(rows.map(({ state }) => state))];
  return states
    .map((state) => `${rows.filter((row) => row.state === state).length} ${deliveryWords[state]}`)
    .join(', ');
}

async function look(problemSetId: string): Promise<readonly DeliveryRow[]> {
  const response = await fetch(paths.deliveriesApi(problemSetId), { headers: { accept: 'application/json' } });
  if (!response.ok) throw new Error(`The deliveries could not be read: ${response.status}.`);
  return (await response.json()) as readonly DeliveryRow[];
}
