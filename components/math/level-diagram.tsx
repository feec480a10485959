import { Group } from '@visx/group';
import { scaleLinear } from '@visx/scale';
import { Line } from '@visx/shape';
import { figureText, sameFigure } from './figures';
import { Picture } from './picture';

/** Two levels in any order; equal for a degenerate pair. */
export type Levels = readonly [number, number];

export interface LevelDiagramProps {
  readonly reference: Levels;
  readonly answer?: Levels;
  /** What the figures are multiples of, as plain text: "ħΩ". */
  readonly unit?: string;
}

const height = 190;
const top = 26;
const columnWidth = 150;
const levelLength = 84;

/** Energy levels as lines at their height, the reference at the left and the answer at the right. */
export function LevelDiagram({ reference, answer, unit }: LevelDiagramProps) {
  const columns = [
    { name: 'reference', levels: ordered(reference), tone: 'grey' as const },
    ...(answer ? [{ name: 'answer', levels: ordered(answer), tone: 'answer' as const }] : []),
  ];
  const all = columns.flatMap((column) => column.levels);
  const lowest = Math.min(...all, 0);
  const highest = Math.max(...all, 0);
  const spread = highest - lowest || 1;
  const y = scaleLinear<number>({
    domain: [lowest - spread * 0.08, highest + spread * 0.08],
    range: [height - 12, top],
  });
  const wanted = ordered(reference);
  const agrees = !answer || ordered(answer).every((level, index) => sameFigure(level, wanted[index] ?? NaN));
  const width = 30 + columns.length * columnWidth;
  return (
    <Picture
      title={`Levels${unit ? `, in units of ${unit}` : ''}`}
      description={columns
        .map((column) => `${column.name}: ${column.levels.map(figureText).join(' and ')}`)
        .join('; ')
        .concat(answer ? (agrees ? '. They agree.' : '. They differ.') : '.')}
      size={[width, height]}
      answer={answer ? (agrees ? 'agrees' : 'differs') : undefined}
      table={{
        head: ['level', ...columns.map((column) => column.name)],
        rows: ['upper', 'lower'].map((name, index) => [
          name,
          ...columns.map((column) => figureText(column.levels[index] ?? NaN)),
        ]),
      }}
    >
      <Line from={{ x: 16, y: y(0) }} to={{ x: width, y: y(0) }} className="stroke-hairline" strokeDasharray="3 4" />
      <text x={0} y={y(0) + 4} className="fill-grey text-[12px]">
        0
      </text>
      {columns.map((column, index) => (
        <Group key={column.name} left={30 + index * columnWidth}>
          <text x={levelLength / 2} y={12} textAnchor="middle" className="fill-grey text-[12px]">
            {column.name}
          </text>
          {column.levels.map((level, rank) => {
            const same = column.tone === 'grey' || sameFigure(level, wanted[rank] ?? NaN);
            const stroke = column.tone === 'grey' ? 'stroke-grey' : same ? 'stroke-verdigris' : 'stroke-madder';
            const twin = sameFigure(column.levels[0], column.levels[1]);
            const lift = twin ? (rank === 0 ? -2.5 : 2.5) : 0;
            return (
              <Group key={rank} top={y(level) + lift}>
                <Line from={{ x: 0, y: 0 }} to={{ x: levelLength, y: 0 }} className={stroke} strokeWidth={2.5} />
                {twin && rank === 1 ? null : (
                  <text x={levelLength + 8} y={4} className={same ? '' : 'fill-madder underline'}>
                    {figureText(level)}
                    {twin ? ' (twice)' : ''}
                  </text>
                )}
              </Group>
            );
          })}
        </Group>
      ))}
    </Picture>
  );
}

/** Upper level first. */
function ordered([first, second]: Levels): Levels {
  return first >= second ? [first, second] : [second, first];
}
