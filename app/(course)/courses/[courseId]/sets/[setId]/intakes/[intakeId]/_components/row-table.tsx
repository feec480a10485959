import { VerdictSign } from '@/components/ui/verdict-sign';
import { ScrollReach } from '@/components/math/scroll-reach';
import { type IntakeRowLine } from '@/lib/queries/intake-rows';

/** The rows of an upload in the order of the sheet, each with what becomes of it. */
export function RowTable({
  rows,
  caption,
  taken,
}: {
  rows: readonly IntakeRowLine[];
  caption: string;
  /** Whether the good rows have been taken in; before, they are only good. */
  taken: boolean;
}) {
  if (rows.length === 0) return <p className="py-4 text-grey">No such row in this sheet.</p>;
  return (
    <ScrollReach>
      <table className="w-full border-collapse text-small">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-edge text-start text-grey">
            {['Line', 'Student', 'Part', 'Answer', 'What becomes of it'].map((word) => (
              <th key={word} scope="col" className="py-1 pe-4 text-start font-semibold">
                {word}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={`${row.line} ${row.question} ${row.part}`} className="border-b border-hairline align-baseline">
              <th scope="row" className="py-1 pe-4 text-start font-normal">
                {row.line}
              </th>
              <td className="py-1 pe-4">{row.student}</td>
              <td className="py-1 pe-4">
                {row.question}
                {row.part}
              </td>
              <td className="max-w-64 py-1 pe-4 font-mono text-note break-words">{row.answer}</td>
              <td className="py-1">
                <What row={row} taken={taken} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollReach>
  );
}

function What({ row, taken }: { row: IntakeRowLine; taken: boolean }) {
  if (row.state === 'refused') {
    return (
      <>
        <span className="font-semibold text-madder">Refused.</span> {row.message}
      </>
    );
  }
  if (row.verdict) return <VerdictSign verdict={row.verdict} detail={row.queued ? 'waits for a person' : undefined} />;
  if (row.checkState === 'waiting') return <>Being checked</>;
  return <>{row.message ?? (taken ? 'Taken in' : 'Good')}</>;
}
