import { type CreationAttributes } from 'sequelize';
import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { CreditEntry } from '@/models/credit-entry';
import { Draw } from '@/models/draw';
import { type ProblemSetItem } from '@/models/problem-set-item';
import { Submission } from '@/models/submission';
import { type User } from '@/models/user';
import { nextNumber } from './next-number';

/** A student's draw for an item. */
export function buildDraw(
  item: ProblemSetItem,
  student: User,
  overrides: Partial<CreationAttributes<Draw>> = {},
): Promise<Draw> {
  return Draw.create({
    itemId: item.id,
    userId: student.id,
    templateVersionId: item.templateVersionId,
    seed: `seed-${nextNumber()}`,
    drawnValues: { n: '3', A: 'S_z' },
    ...overrides,
  });
}

/** A typed submission for a draw. */
export function buildSubmission(
  draw: Draw,
  overrides: Partial<CreationAttributes<Submission>> = {},
): Promise<Submission> {
  return Submission.create({
    drawId: draw.id,
    userId: draw.userId,
    source: 'typed',
    submittedAt: new Date(),
    receipt: `RCPT-${String(nextNumber()).padStart(6, '0')}`,
    ...overrides,
  });
}

/**
 * The next attempt at a part, in a submission of its own unless `submission` says which; an attempt that stood before is
 * superseded. Unchecked unless followed by `buildAnswerCheck`.
 */
export async function buildAnswer(
  draw: Draw,
  options: { partKey?: string; text?: string; submission?: Submission } = {},
): Promise<Answer> {
  const part = { drawId: draw.id, partKey: options.partKey ?? 'a' };
  const submission = options.submission ?? (await buildSubmission(draw));
  await Answer.update({ supersededAt: new Date() }, { where: { ...part, supersededAt: null } });
  return Answer.create({
    ...part,
    submissionId: submission.id,
    attempt: (await Answer.count({ where: part })) + 1,
    text: options.text ?? 'i hbar S_z',
  });
}

/** A check of an answer, made the answer's current one. Agrees unless overrides say otherwise. */
export async function buildAnswerCheck(
  answer: Answer,
  overrides: Partial<CreationAttributes<AnswerCheck>> = {},
): Promise<AnswerCheck> {
  const draw = await Draw.findByPk(answer.drawId, { rejectOnEmpty: true });
  const check = await AnswerCheck.create({
    answerId: answer.id,
    checkerVersion: 'test-1',
    templateVersionId: draw.templateVersionId,
    verdict: 'agrees',
    readingLatex: '\\mathrm{i}\\hbar S_z',
    readingPlain: 'i hbar S_z',
    referenceLatex: '\\mathrm{i}\\hbar S_z',
    message: 'Equal to the reference.',
    form: 'evaluated',
    evidence: { test: 'modular', bound: 1e-20, points: 3 },
    milliseconds: 0.1,
    ...overrides,
  });
  await answer.update({ checkState: 'checked', currentCheckId: check.id });
  return check;
}

/** The next entry of an answer's credit, made the current one. Credits are thousandths; full credit by the machine. */
export async function buildCreditEntry(
  answer: Answer,
  overrides: Partial<CreationAttributes<CreditEntry>> = {},
): Promise<CreditEntry> {
  const entry = await CreditEntry.create({
    answerId: answer.id,
    credit: 3000,
    outOf: 3000,
    source: 'automatic',
    previousEntryId: answer.currentCreditEntryId ?? null,
    ...overrides,
  });
  await answer.update({ currentCreditEntryId: entry.id });
  return entry;
}
