import { writeFile } from 'node:fs/promises';
import path from 'node:path';
import { inTransaction } from '@/lib/db/transaction';
import { assertTextSheet } from '@/lib/intake/sniff-sheet';
import { discardIncoming, readKept, incomingFolder, incomingName, keepFile } from '@/lib/uploads/storage';
import { commitIntake } from '@/lib/services/commit-intake';
import { readIntake } from '@/lib/services/read-intake';
import { receiveIntake } from '@/lib/services/receive-intake';
import { storeIntakeRows } from '@/lib/services/store-intake-rows';
import { type User } from '@/models/user';
import { actingAs } from '../../factories/context';

/** Receives a sheet as the upload route does and reads it as the worker does; gives the intake's id. */
export async function uploadSheet(
  uploader: User,
  problemSetId: string,
  content: string | Uint8Array,
  originalName = 'answers.csv',
): Promise<string> {
  const incoming = path.join(await incomingFolder(), incomingName());
  await writeFile(incoming, content);
  try {
    await assertTextSheet(incoming);
    const file = await keepFile(incoming);
    const { intakeId } = await actingAs(uploader, (context) =>
      receiveIntake(context, { problemSetId, file, originalName }),
    );
    await readIntake(intakeId, readKept);
    return intakeId;
  } finally {
    await discardIncoming(incoming);
  }
}

/** Takes in the good rows of an intake, all at once. */
export async function takeIn(uploader: User, intakeId: string): Promise<void> {
  await actingAs(uploader, (context) => commitIntake(context, { intakeId, goodRowsOnly: true }));
  const system = { kind: 'system', name: 'test' } as const;
  for (let more = true; more;) {
    more = await inTransaction((transaction) =>
      storeIntakeRows({ actor: system, transaction, now: new Date() }, { intakeId, most: 100 }),
    );
  }
}

/** Rows of an answer sheet under its header. */
export function sheetOf(...rows: readonly (readonly [string, number | string, string, string])[]): string {
  const quoted = rows.map((row) => row.map((cell) => `"${String(cell).replaceAll('"', '""')}"`).join(','));
  return ['student,question,part,answer', ...quoted].join('\r\n');
}
