import { Sign } from '@/components/ui/verdict-sign';

const indices = [1, 2] as const;

/** Which elements of a matrix, or components of a column, differ: a sign in the place of each. Indices count from 1. */
export function Elements({ elements }: { elements: readonly (readonly number[])[] }) {
  if (elements.length === 0) return null;
  const isMatrix = elements.every((element) => element.length === 2);
  if (!isMatrix) {
    return (
      <p className="text-small">Differs in component {elements.map((element) => element.join(', ')).join(' and ')}.</p>
    );
  }
  const differs = (row: number, column: number) => elements.some(([r, c]) => r === row && c === column);
  return (
    <table className="justify-self-start border-x-2 border-edge text-small">
      <caption className="mb-1 text-start text-note text-grey">Element by element</caption>
      <tbody>
        {indices.map((row) => (
          <tr key={row}>
            {indices.map((column) => {
              const verdict = differs(row, column) ? 'differs' : 'agrees';
              return (
                <td key={column} className="px-4 py-2">
                  <Sign
                    verdict={verdict}
                    className={`h-5 w-5 ${verdict === 'differs' ? 'text-madder' : 'text-verdigris'}`}
                  />
                  <span className="sr-only">
                    row {row}, column {column} {verdict}
                  </span>
                </td>
              );
            })}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
