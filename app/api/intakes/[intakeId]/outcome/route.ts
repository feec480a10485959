import { z } from 'zod';
import { handleRoute } from '@/app/_server/handle-route';
import { sheetResponse, writeSheet } from '@/lib/intake/write-sheet';
import { allIntakeRows, type IntakeRowLine } from '@/lib/queries/intake-rows';
import { openIntake } from '@/lib/services/open-intake';

const parameters = z.object({ intakeId: z.uuid() });

const columns = ['line', 'student', 'question', 'part', 'answer', 'row', 'note', 'attempt', 'verdict', 'person'];

/** The outcome sheet of an upload: each row with what became of it. */
export const GET = handleRoute(async ({ actor, params }) => {
  const intake = await openIntake(actor, parameters.parse(params));
  const rows = async function* () {
    for await (const row of allIntakeRows(intake.id)) yield cellsOf(row);
  };
  return sheetResponse(writeSheet(columns, rows()), `outcome-${intake.id.slice(0, 8)}.csv`);
});

function cellsOf(row: IntakeRowLine): (string | number | null)[] {
  const verdict =
    row.verdict ?? (row.checkState === null ? '' : row.checkState === 'failed' ? 'not checked' : 'waiting');
  return [
    row.line,
    row.student,
    row.question,
    row.part,
    row.answer,
    row.state === 'accepted' ? 'taken in' : 'refused',
    row.message ?? '',
    row.attempt,
    verdict,
    row.queued ? 'waits for a person' : '',
  ];
}
