import { randomBytes } from 'node:crypto';
import { Op } from 'sequelize';
import { Answer } from '@/models/answer';
import { Draw } from '@/models/draw';
import { QueueItem } from '@/models/queue-item';
import { Submission, type SubmissionSource } from '@/models/submission';
import { liveQueueItemStates } from '@/lib/domain/queue-item-state';
import { HalfmarkError } from '@/lib/errors';
import type { ServiceContext } from './context';

/** What is handed in at once for one draw; part keys are known to exist in the draw's template version. */
export type SubmissionInput = {
  drawId: string;
  answers: readonly { partKey: string; text: string }[];
  source: SubmissionSource;
  late: boolean;
  /** A key made by the sender, so that the same hand-in sent twice is stored once. */
  clientKey?: string;
  intakeId?: string;
};

export type StoredSubmission = {
  submissionId: string;
  receipt: string;
  /** False where this hand-in had been stored before. */
  isNew: boolean;
  answers: { answerId: string; partKey: string; attempt: number }[];
};

/**
 * Stores a hand-in: each part becomes a new attempt, the earlier attempt is kept but no longer stands, and what waited
 * for a person because of it is withdrawn. One hand-in per draw at a time, and the same client key only once. Callers
 * have authorised, and ask for the checking.
 */
export async function storeSubmission(context: ServiceContext, input: SubmissionInput): Promise<StoredSubmission> {
  const { transaction, now } = context;
  const draw = await Draw.findByPk(input.drawId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!draw) throw new HalfmarkError('not-found');
  const before = input.clientKey
    ? await Submission.findOne({ where: { clientKey: input.clientKey, drawId: draw.id }, transaction })
    : null;
  if (before) return storedBefore(context, before);

  const submission = await Submission.create(
    {
      drawId: draw.id,
      userId: draw.userId,
      source: input.source,
      submittedAt: now,
      receipt: makeReceipt(),
      clientKey: input.clientKey ?? null,
      intakeId: input.intakeId ?? null,
      late: input.late,
    },
    { transaction },
  );
  const answers: StoredSubmission['answers'] = [];
  for (const { partKey, text } of input.answers) {
    const attempt = await supersedeEarlier(context, draw.id, partKey);
    const answer = await Answer.create(
      {
        submissionId: submission.id,
        drawId: draw.id,
        partKey,
        attempt,
        text,
        supersededAt: null,
        currentCheckId: null,
        currentCreditEntryId: null,
      },
      { transaction },
    );
    answers.push({ answerId: answer.id, partKey, attempt });
  }
  return { submissionId: submission.id, receipt: submission.receipt, isNew: true, answers };
}

/** Ends the standing attempt at a part, withdraws what waits because of it, and returns the next attempt's number. */
async function supersedeEarlier(
  { transaction, now }: ServiceContext,
  drawId: string,
  partKey: string,
): Promise<number> {
  const last = await Answer.findOne({ where: { drawId, partKey }, order: [['attempt', 'DESC']], transaction });
  if (!last) return 1;
  await Answer.update({ supersededAt: now }, { where: { drawId, partKey, supersededAt: null }, transaction });
  await QueueItem.update(
    { state: 'withdrawn', heldBy: null, heldUntil: null },
    { where: { answerId: last.id, state: { [Op.in]: [...liveQueueItemStates] } }, transaction },
  );
  return last.attempt + 1;
}

async function storedBefore({ transaction }: ServiceContext, submission: Submission): Promise<StoredSubmission> {
  const answers = await Answer.findAll({
    where: { submissionId: submission.id },
    order: [['partKey', 'ASC']],
    transaction,
  });
  return {
    submissionId: submission.id,
    receipt: submission.receipt,
    isNew: false,
    answers: answers.map(({ id, partKey, attempt }) => ({ answerId: id, partKey, attempt })),
  };
}

/** Letters and digits that are not mistaken for one another when read aloud or copied by hand. */
const receiptAlphabet = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';

/** A receipt a student can quote: twelve characters in three groups, about 60 random bits. */
function makeReceipt(): string {
  const characters = Array.from(randomBytes(12), (byte) => receiptAlphabet[byte % 32]);
  return [0, 4, 8].map((start) => characters.slice(start, start + 4).join('')).join('-');
}
