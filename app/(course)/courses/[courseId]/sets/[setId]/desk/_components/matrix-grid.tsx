import { Typeset } from '@/components/math/typeset';
import { type MatrixElements } from '@/lib/presenters/matrix-elements';

interface MatrixGridProps {
  readonly elements: MatrixElements;
  /** Which elements differ, by row and column. */
  readonly differ: readonly (readonly boolean[])[];
}

/** A matrix or column, element by element; those that differ are underlined and coloured, and said so in words. */
export function MatrixGrid({ elements: { before, rows, behind }, differ }: MatrixGridProps) {
  return (
    <div className="flex items-center justify-center gap-1 py-2">
      {before ? <Typeset latex={before} /> : null}
      <div className="rounded-[1.1rem] border-x-2 border-ink px-1">
        <table role="presentation">
          <tbody>
            {rows.map((row, at) => (
              <tr key={at}>
                {row.map((element, column) => (
                  <td key={column} className="px-2 py-1 text-center">
                    {differ[at]?.[column] ? (
                      <span className="border-b-2 border-madder text-madder">
                        <Typeset latex={element} />
                        <span className="sr-only"> differs</span>
                      </span>
                    ) : (
                      <Typeset latex={element} />
                    )}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {behind ? <Typeset latex={behind} /> : null}
    </div>
  );
}
