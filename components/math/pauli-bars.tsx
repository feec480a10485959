import { Group } from '@visx/group';
import { scaleLinear } from '@visx/scale';
import { Bar, Line } from '@visx/shape';
import { figureText, sameFigure } from './figures';
import { Picture } from './picture';

/** A number with its imaginary part. */
export interface ComplexFigure {
  readonly re: number;
  readonly im: number;
}

/** Coefficients of a0·1 + a·σ, in this order. */
export type PauliFigures = readonly [ComplexFigure, ComplexFigure, ComplexFigure, ComplexFigure];

export interface PauliBarsProps {
  readonly reference: PauliFigures;
  readonly answer?: PauliFigures;
  /** What the figures are multiples of, as plain text: "ħΩ/2". */
  readonly unit?: string;
}

interface BarRow {
  readonly name: string;
  readonly reference: number;
  readonly answer?: number;
}

const names = ['1', 'x', 'y', 'z'] as const;
const width = 440;
const rowHeight = 38;
const left = 46;
const right = 336;

/** The Pauli coefficients of an operator as bars from a common zero, reference above, answer below. */
export function PauliBars({ reference, answer, unit }: PauliBarsProps) {
  const rows = barRows(reference, answer);
  const largest = Math.max(1e-12, ...rows.flatMap((row) => [Math.abs(row.reference), Math.abs(row.answer ?? 0)]));
  const x = scaleLinear<number>({ domain: [-largest, largest], range: [left, right] });
  const differing = rows.filter(differs);
  const zero = x(0);
  return (
    <Picture
      title={`Pauli coefficients${unit ? `, in units of ${unit}` : ''}`}
      description={describe(rows, differing, answer !== undefined)}
      size={[width, rows.length * rowHeight + 6]}
      answer={answer ? (differing.length > 0 ? 'differs' : 'agrees') : undefined}
      table={{
        head: answer ? ['coefficient of', 'reference', 'answer'] : ['coefficient of', 'reference'],
        rows: rows.map((row) => [
          row.name,
          figureText(row.reference),
          ...(row.answer === undefined ? [] : [figureText(row.answer)]),
        ]),
      }}
    >
      <Line
        from={{ x: zero, y: 0 }}
        to={{ x: zero, y: rows.length * rowHeight + 6 }}
        className="stroke-edge"
        strokeWidth={1}
      />
      {rows.map((row, index) => (
        <Group key={row.name} top={index * rowHeight + 6}>
          <text x={0} y={19}>
            {row.name}
          </text>
          <FigureBar from={zero} to={x(row.reference)} top={4} className="fill-grey" />
          <text x={width} y={13} textAnchor="end" className="fill-grey text-[12px]">
            {figureText(row.reference)}
          </text>
          {row.answer === undefined ? null : (
            <>
              <FigureBar
                from={zero}
                to={x(row.answer)}
                top={16}
                className={`figure-answer ${differs(row) ? 'fill-madder' : 'fill-verdigris'}`}
              />
              <text
                x={width}
                y={27}
                textAnchor="end"
                className={`text-[12px] ${differs(row) ? 'fill-madder underline' : ''}`}
              >
                {figureText(row.answer)}
              </text>
            </>
          )}
        </Group>
      ))}
    </Picture>
  );
}

function FigureBar({ from, to, top, className }: { from: number; to: number; top: number; className: string }) {
  return (
    <Bar x={Math.min(from, to)} y={top} width={Math.max(1, Math.abs(to - from))} height={8} className={className} />
  );
}

/** One row a coefficient; imaginary parts have a row only where one of the two is not real. */
function barRows(reference: PauliFigures, answer: PauliFigures | undefined): readonly BarRow[] {
  return names.flatMap((name, index) => {
    const wanted = reference[index] ?? { re: 0, im: 0 };
    const given = answer?.[index];
    const real = { name, reference: wanted.re, answer: given?.re };
    const imaginary = { name: `${name}, imaginary`, reference: wanted.im, answer: given?.im };
    return sameFigure(wanted.im, 0) && sameFigure(given?.im ?? 0, 0) ? [real] : [real, imaginary];
  });
}

function differs(row: BarRow): boolean {
  return row.answer !== undefined && !sameFigure(row.reference, row.answer);
}

function describe(rows: readonly BarRow[], differing: readonly BarRow[], compared: boolean): string {
  if (!compared) return rows.map((row) => `${row.name}: ${figureText(row.reference)}`).join('; ');
  if (differing.length === 0) return 'Reference and answer have the same coefficients.';
  return `Reference and answer differ in ${differing
    .map((row) => `${row.name} (${figureText(row.reference)} against ${figureText(row.answer ?? 0)})`)
    .join(', ')}.`;
}
