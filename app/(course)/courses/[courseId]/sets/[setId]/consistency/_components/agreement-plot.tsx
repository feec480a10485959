import { Group } from '@visx/group';
import { scaleLinear } from '@visx/scale';
import { Line } from '@visx/shape';
import { Picture } from '@/components/math/picture';
import { coefficient, intervalText, kappaIntervalText, kappaText, percent } from '@/lib/presenters/agreement-words';
import { type ConsistencyRow } from '@/lib/presenters/consistency';

const width = 420;
const rowHeight = 62;
const head = 8;
const left = 12;
const right = 368;
const ticks = [0, 0.25, 0.5, 0.75, 1];

/**
 * One band a row: its name, the share of equal credits as a disc with its interval, and kappa as a ring below, on one
 * scale from 0 to 1. What of kappa lies below zero is cut at the edge; the table has the figure.
 */
export function AgreementPlot({ rows }: { rows: readonly ConsistencyRow[] }) {
  const bottom = head + rows.length * rowHeight;
  const x = scaleLinear<number>({ domain: [0, 1], range: [left, right], clamp: true });
  return (
    <Picture
      title="Share of equal credits (disc) and kappa (ring), with 95 % intervals"
      description={rows.map(describe).join(' ')}
      size={[width, bottom + 22]}
      table={{
        head: ['graders', 'pairs', 'same credit', '95 % interval', 'kappa', 'interval of kappa'],
        rows: rows.map(({ name, agreement }) => [
          name,
          String(agreement.pairs),
          agreement.agreement ? percent(agreement.agreement.share) : '',
          agreement.agreement ? intervalText(agreement.agreement.interval, percent) : '',
          kappaText(agreement),
          kappaIntervalText(agreement),
        ]),
      }}
    >
      {ticks.map((tick) => (
        <Group key={tick}>
          <Line from={{ x: x(tick), y: head }} to={{ x: x(tick), y: bottom }} className="stroke-hairline" />
          <text x={x(tick)} y={bottom + 16} textAnchor="middle" className="fill-grey text-[12px]">
            {tick}
          </text>
        </Group>
      ))}
      {rows.map((row, index) => (
        <Band key={row.id} row={row} top={head + index * rowHeight} x={x} />
      ))}
    </Picture>
  );
}

function Band({
  row: { name, agreement },
  top,
  x,
}: {
  row: ConsistencyRow;
  top: number;
  x: (value: number) => number;
}) {
  const { agreement: same, kappa, kappaIntervalHolds, pairs } = agreement;
  return (
    <Group top={top}>
      <text x={left + 4} y={13} className="text-[13px]">
        {name}
        <tspan className="fill-grey">{` · ${pairs} ${pairs === 1 ? 'pair' : 'pairs'}`}</tspan>
      </text>
      {same ? (
        <g className="fill-blue stroke-blue">
          <Whisker from={x(same.interval.lower)} to={x(same.interval.upper)} y={28} />
          <circle cx={x(same.share)} cy={28} r={5} />
          <text x={right + 14} y={32} className="fill-ink stroke-none text-[12px]">
            {percent(same.share)}
          </text>
        </g>
      ) : null}
      {kappa.defined ? (
        <g className="fill-field stroke-grey">
          {kappaIntervalHolds ? <Whisker from={x(kappa.interval.lower)} to={x(kappa.interval.upper)} y={46} /> : null}
          <circle cx={x(kappa.kappa)} cy={46} r={4.5} strokeWidth={2} />
          <text x={right + 14} y={50} className="fill-grey stroke-none text-[12px]">
            {coefficient(kappa.kappa)}
          </text>
        </g>
      ) : (
        <text x={left + 4} y={50} className="fill-grey text-[12px]">
          kappa is not defined
        </text>
      )}
    </Group>
  );
}

function Whisker({ from, to, y }: { from: number; to: number; y: number }) {
  return (
    <path
      d={`M${from} ${y - 4}v8M${to} ${y - 4}v8M${from} ${y}H${to}`}
      fill="none"
      strokeWidth={1.6}
      strokeLinecap="round"
    />
  );
}

function describe({ name, agreement }: ConsistencyRow): string {
  const { agreement: same, pairs } = agreement;
  if (same === null) return `${name}: no pairs.`;
  return `${name}, ${pairs} ${pairs === 1 ? 'pair' : 'pairs'}: same credit ${percent(same.share)}, interval ${intervalText(same.interval, percent)}; kappa ${kappaText(agreement)}.`;
}
