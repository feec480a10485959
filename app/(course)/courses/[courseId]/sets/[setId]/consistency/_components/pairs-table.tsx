import { DataTable, type TableColumn } from '@/components/ui/data-table';
import { intervalText, kappaIntervalText, kappaText, percent } from '@/lib/presenters/agreement-words';
import { type ConsistencyRow } from '@/lib/presenters/consistency';

const columns: readonly TableColumn[] = [
  { key: 'name', label: 'Graders', heading: true },
  { key: 'pairs', label: 'Pairs', align: 'end' },
  { key: 'same', label: 'Same credit', align: 'end' },
  { key: 'interval', label: '95 % interval', align: 'end', sortable: false },
  { key: 'kappa', label: 'Kappa', align: 'end' },
  { key: 'kappaInterval', label: '95 % interval of kappa', align: 'end', sortable: false },
  { key: 'difference', label: 'First less other', align: 'end' },
  { key: 'apart', label: 'Beyond tolerance', align: 'end' },
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
            text: percent(agreement.agreement.share),
          },
          interval: agreement.agreement && intervalText(agreement.agreement.interval, percent),
          kappa: { value: agreement.kappa.defined ? agreement.kappa.kappa : null, text: kappaText(agreement) },
          kappaInterval: kappaIntervalText(agreement),
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
