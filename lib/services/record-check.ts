import { Answer } from '@/models/answer';
import { AnswerCheck } from '@/models/answer-check';
import { CreditRule } from '@/models/credit-rule';
import { Draw } from '@/models/draw';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { TemplateVersion } from '@/models/template-version';
import type { CheckResponse } from '@/lib/checker/contract';
import { shareOfCredit, type Thousandths } from '@/lib/domain/credit';
import { decideMarking, type SlipCredit } from '@/lib/domain/decide-marking';
import { setPolicySchema } from '@/lib/domain/set-policy';
import { HalfmarkError } from '@/lib/errors';
import { pointsOfPart } from '@/lib/templates/points-of-part';
import { reissueIfReleased } from './compose-score-report';
import type { ServiceContext } from './context';
import { giveCredit } from './give-credit';
import { openQueueItem } from './open-queue-item';

/** What the checker found of one answer, with the texts that pages show. */
export type CheckRecord = {
  answerId: string;
  checkerVersion: string;
  response: CheckResponse;
  readingPlain: string;
  referenceLatex: string;
};

/**
 * Stores one verdict of one answer and lets it take effect by the set's policy: an automatic credit, or an item in the
 * review queue. Told the same a second time it changes nothing, so a job that is run again does no harm. Only the
 * standing attempt is marked; an earlier one keeps its verdict for the record.
 *
 * @returns whether the verdict was new
 */
export async function recordCheck(context: ServiceContext, record: CheckRecord): Promise<boolean> {
  const { transaction } = context;
  const answer = await Answer.findByPk(record.answerId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!answer) throw new HalfmarkError('not-found', 'That answer is no longer here.');
  const place = await placeOf(context, answer);
  const [check, isNew] = await AnswerCheck.findOrCreate({
    where: {
      answerId: answer.id,
      checkerVersion: record.checkerVersion,
      templateVersionId: place.version.id,
      followThroughBasis: '',
    },
    defaults: storedForm(answer.id, place.version.id, record),
    transaction,
  });
  if (!isNew && answer.checkState === 'checked') return false;
  await answer.update({ checkState: 'checked', currentCheckId: check.id }, { transaction });
  if (answer.supersededAt === null) await mark(context, answer, place, record.response);
  return isNew;
}

type Place = { set: ProblemSet; item: ProblemSetItem; version: TemplateVersion; studentId: string };

async function placeOf({ transaction }: ServiceContext, answer: Answer): Promise<Place> {
  const draw = await Draw.findByPk(answer.drawId, { transaction, rejectOnEmpty: true });
  const version = await TemplateVersion.findByPk(draw.templateVersionId, { transaction, rejectOnEmpty: true });
  const item = await ProblemSetItem.findByPk(draw.itemId, { transaction, rejectOnEmpty: true });
  const set = await ProblemSet.findByPk(item.problemSetId, { transaction, rejectOnEmpty: true });
  return { set, item, version, studentId: draw.userId };
}

function storedForm(answerId: string, templateVersionId: string, record: CheckRecord) {
  const { response } = record;
  return {
    answerId,
    templateVersionId,
    checkerVersion: record.checkerVersion,
    followThroughBasis: '',
    verdict: response.verdict,
    slip: response.slip,
    slips: [...response.slips],
    kinKey: response.kinKey,
    readingLatex: response.reading,
    readingPlain: record.readingPlain,
    referenceLatex: record.referenceLatex,
    message: response.message,
    form: response.evidence.form ?? null,
    evidence: response.evidence,
    followThrough: null,
    milliseconds: response.ms,
  };
}

async function mark(context: ServiceContext, answer: Answer, place: Place, response: CheckResponse): Promise<void> {
  const outOf = pointsOfPart(place.version.content, place.item.points, answer.partKey);
  const slipCredits = await slipCreditsOf(context, place, answer.partKey, outOf);
  const decision = decideMarking(
    {
      verdict: response.verdict,
      slips: response.slips,
      notEvaluated: response.evidence.form === 'not evaluated',
      followsThrough: false,
    },
    {
      outOf,
      slipCredits,
      alwaysPerson: place.version.content.parts.find((part) => part.key === answer.partKey)?.alwaysPerson ?? false,
    },
    setPolicySchema.parse(place.set.policy),
  );
  if (decision.kind === 'automatic') {
    await giveCredit(context, {
      answerId: answer.id,
      credit: decision.credit,
      outOf,
      source: decision.rule === null ? 'automatic' : 'rule',
      reason: decision.rule ?? response.verdict,
    });
    await reissueIfReleased(context, {
      problemSetId: place.set.id,
      userId: place.studentId,
      reason: 'A part that was still being marked has been marked.',
    });
    return;
  }
  await openQueueItem(context, {
    problemSetId: place.set.id,
    itemId: place.item.id,
    answerId: answer.id,
    partKey: answer.partKey,
    kind: 'review',
    reasons: decision.reasons,
    kinKey: response.kinKey,
    suggestedCredit: decision.suggestion,
    suggestedRule: decision.rule,
  });
}

/** What slips earn in a part: the set's own rules first, then the author's expected answers, then the author's slips. */
async function slipCreditsOf(
  { transaction }: ServiceContext,
  { item, version }: Place,
  partKey: string,
  outOf: Thousandths,
): Promise<SlipCredit[]> {
  const rules = await CreditRule.findAll({ where: { itemId: item.id, partKey, retiredAt: null }, transaction });
  const part = version.content.parts.find(({ key }) => key === partKey);
  const ofSet: SlipCredit[] = rules.map(({ slip, credit }) => ({ slip, credit }));
  const ofAuthor = [
    ...(part?.expected.map(({ id, share }) => ({ slip: id, share })) ?? []),
    ...(part?.slips ?? []),
  ].map(({ slip, share }): SlipCredit => ({
    slip,
    credit: share === 'person' ? 'person' : shareOfCredit(outOf, share, 1000),
  }));
  return [...ofSet, ...ofAuthor.filter(({ slip }) => !ofSet.some((rule) => rule.slip === slip))];
}
