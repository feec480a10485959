import { DataTable, type TableColumn } from '@/components/ui/data-table';
import { intervalText, kappaIntervalText, kappaText, percent } from '@/lib/presenters/agreement-words';
import { type ConsistencyRow } from '@/lib/presenters/consistency';

const columns: readonly TableColumn[] = [
  { key: 'name', label: 'Graders', heading: true },
  { key: 'pairs', label: 'Pairs', align: 'end' },
  { key: 'same', label: 'Same credit', align: 'end' },
  { key: 'kappa', label: 'Kappa', align: 'end' },
  { key: 'difference', label: 'Leaning', align: 'end' },
  { key: 'apart', label: 'Apart', align: 'end' },
];

/** The figures of each two graders. */
export function PairsTable({ rows }: { rows: readonly ConsistencyRow[] }) {
  return (
    <DataTable
      caption="Graders in pairs"
      columns={columns}
      filterLabel={null}
      rows={rows.map(({ id, name, agreement, apart }) => ({
        id,
        cells: {
          name,
          pairs: agreement.pairs,
          same: agreement.agreement && {
            value: agreement.agreement.share,
            node: (
              <WithInterval
                figure={percent(agreement.agreement.share)}
                interval={intervalText(agreement.agreement.interval, percent)}
              />
            ),
          },
          kappa: {
            value: agreement.kappa.defined ? agreement.kappa.kappa : null,
            node: (
              <WithInterval
                figure={kappaText(agreement)}
                interval={agreement.kappa.defined ? kappaIntervalText(agreement) : ''}
              />
            ),
          },
          difference: {
            value: agreement.meanDifference,
            text: agreement.meanDifference === null ? '' : percent(agreement.meanDifference),
          },
          apart,
        },
      }))}
    />
  );
}

function WithInterval({ figure, interval }: { figure: string; interval: string }) {
  return (
    <>
      <span className="whitespace-nowrap">{figure}</span>
      <span className="block text-note whitespace-nowrap text-grey">{interval}</span>
    </>
  );
}
