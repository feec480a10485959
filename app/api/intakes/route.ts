import { z } from 'zod';
import { handleRoute } from '@/app/_server/handle-route';
import { inTransaction } from '@/lib/db/transaction';
import { assertTextSheet } from '@/lib/intake/sniff-sheet';
import { assertMayTakeIn, MAX_SHEET_BYTES, receiveIntake } from '@/lib/services/receive-intake';
import { receiveUpload } from '@/lib/uploads/receive-upload';
import { discardIncoming, keepFile } from '@/lib/uploads/storage';

const query = z.object({ set: z.uuid() });

/** Takes one answer sheet for a set: refused before a byte is read where the person may not, then streamed to disk. */
export const POST = handleRoute(async ({ request, actor, now }) => {
  const { set } = query.parse(Object.fromEntries(new URL(request.url).searchParams));
  await inTransaction((transaction) => assertMayTakeIn({ actor, transaction, now }, set));
  const upload = await receiveUpload(request, MAX_SHEET_BYTES);
  try {
    await assertTextSheet(upload.incomingPath);
    const file = await keepFile(upload.incomingPath);
    const { intakeId } = await inTransaction((transaction) =>
      receiveIntake({ actor, transaction, now }, { problemSetId: set, file, originalName: upload.originalName }),
    );
    return Response.json({ intakeId }, { status: 201 });
  } finally {
    await discardIncoming(upload.incomingPath);
  }
});
