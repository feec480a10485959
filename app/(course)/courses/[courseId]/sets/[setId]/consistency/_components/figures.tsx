import { DefinitionList } from '@/components/ui/definition-list';
import { intervalText, kappaIntervalText, kappaText, percent } from '@/lib/presenters/agreement-words';
import { type ConsistencyRow } from '@/lib/presenters/consistency';

/** The overall figures, in the margin: the share of equal credits large, then what it rests on. */
export function Figures({ row, outstanding }: { row: ConsistencyRow; outstanding: number }) {
  const { agreement, apart } = row;
  return (
    <div className="grid gap-3">
      <p className="flex flex-wrap items-baseline gap-x-2">
        <span className="text-mark font-semibold">
          {agreement.agreement === null ? '–' : percent(agreement.agreement.share)}
        </span>
        <span className="text-small text-grey">the same credit</span>
      </p>
      <DefinitionList
        items={[
          { term: 'pairs', value: agreement.pairs },
          ...(agreement.agreement === null
            ? []
            : [
                { term: '95 % interval', value: intervalText(agreement.agreement.interval, percent) },
                { term: 'kappa', value: kappaText(agreement) },
                { term: 'its interval', value: kappaIntervalText(agreement) },
                { term: 'beyond tolerance', value: apart },
              ]),
          { term: 'still to be done', value: outstanding },
        ]}
      />
    </div>
  );
}
