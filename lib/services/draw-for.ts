import { randomBytes } from 'node:crypto';
import { type Transaction } from 'sequelize';
import { Draw } from '@/models/draw';
import { Membership } from '@/models/membership';
import { ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { TemplateVersion } from '@/models/template-version';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { HalfmarkError } from '@/lib/errors';
import { log } from '@/lib/log';
import { decide, requireAllowed } from '@/lib/policies/decide';
import { courseForActor } from '@/lib/queries/course-for-actor';
import { type DrawnValues, type TemplateContent } from '@/lib/templates/content';
import { drawValues } from '@/lib/templates/draw-values';
import { type ServiceContext } from './context';

/** One question as one student has it. `content` holds the reference and never leaves the server as it is. */
export type DrawnItem = {
  drawId: string;
  itemId: string;
  userId: string;
  position: number;
  /** Points of the item in thousandths of a mark. */
  points: number;
  templateVersionId: string;
  content: TemplateContent;
  values: DrawnValues;
};

/**
 * The student's draws for every item of a set, in the order of the items; those that are missing are drawn now. A draw
 * once made never changes, and two calls at the same moment get the same one.
 *
 * The student asks for their own; graders who take in answers, and jobs, ask for any student's of the course. Nothing is
 * drawn before the set has begun. Throws `not-found`, `forbidden` or `wrong-state`.
 */
export async function drawSet(
  context: ServiceContext,
  input: { problemSetId: string; userId: string },
): Promise<DrawnItem[]> {
  const set = await ProblemSet.findByPk(input.problemSetId, { transaction: context.transaction });
  if (set === null) throw new HalfmarkError('not-found');
  await authorise(context, set, input.userId);
  const items = await ProblemSetItem.findAll({
    where: { problemSetId: set.id },
    order: [['position', 'asc']],
    transaction: context.transaction,
  });
  return drawItems(context.transaction, items, input.userId);
}

/** The student's draw for one item, as `drawSet` makes it. */
export async function drawFor(context: ServiceContext, input: { itemId: string; userId: string }): Promise<DrawnItem> {
  const item = await ProblemSetItem.findByPk(input.itemId, { transaction: context.transaction });
  const set = item && (await ProblemSet.findByPk(item.problemSetId, { transaction: context.transaction }));
  if (item === null || set === null) throw new HalfmarkError('not-found');
  await authorise(context, set, input.userId);
  const [drawn] = await drawItems(context.transaction, [item], input.userId);
  if (drawn === undefined) throw new HalfmarkError('not-found');
  return drawn;
}

async function authorise({ actor, transaction, now }: ServiceContext, set: ProblemSet, userId: string): Promise<void> {
  const course = await courseForActor(actor, set.courseId, transaction);
  const student = await Membership.findOne({
    where: { courseId: set.courseId, userId, role: 'student', leftAt: null },
    transaction,
  });
  if (student === null) throw new HalfmarkError('not-found');
  const isOwn = actor.kind === 'user' && actor.userId === userId;
  requireAllowed(decide(actor, isOwn ? 'answer-own-draws' : 'take-in-answers', course));
  if (!hasBegun(set, now)) throw new HalfmarkError(isOwn ? 'not-found' : 'wrong-state');
}

async function drawItems(
  transaction: Transaction,
  items: readonly ProblemSetItem[],
  userId: string,
): Promise<DrawnItem[]> {
  const draws = await storedDraws(transaction, items, userId);
  // A draw keeps the version it was made from, even where its item has another by now.
  const versionIds = [...items, ...draws.values()].map((row) => row.templateVersionId);
  const versions = await TemplateVersion.findAll({ where: { id: [...new Set(versionIds)] }, transaction });
  const contents = new Map(versions.map((version) => [version.id, version.content]));
  const missing = items.filter((item) => !draws.has(item.id));
  if (missing.length > 0) {
    await Draw.bulkCreate(
      missing.map((item) => ({ ...newDraw(contentOf(contents, item.templateVersionId)), ...keysOf(item, userId) })),
      // Another request may draw at the same moment: its draw stands, and is read below.
      { ignoreDuplicates: true, transaction },
    );
    for (const [itemId, draw] of await storedDraws(transaction, missing, userId)) draws.set(itemId, draw);
  }
  return items.map((item) => {
    const draw = draws.get(item.id);
    if (draw === undefined) throw new HalfmarkError('unexpected', undefined, { log: `no draw for item ${item.id}` });
    return {
      drawId: draw.id,
      itemId: item.id,
      userId,
      position: item.position,
      points: item.points,
      templateVersionId: draw.templateVersionId,
      content: contentOf(contents, draw.templateVersionId),
      values: draw.drawnValues,
    };
  });
}

function keysOf(item: ProblemSetItem, userId: string) {
  return { itemId: item.id, userId, templateVersionId: item.templateVersionId };
}

async function storedDraws(
  transaction: Transaction,
  items: readonly ProblemSetItem[],
  userId: string,
): Promise<Map<string, Draw>> {
  const draws = await Draw.findAll({ where: { itemId: items.map((item) => item.id), userId }, transaction });
  return new Map(draws.map((draw) => [draw.itemId, draw]));
}

function contentOf(contents: ReadonlyMap<string, TemplateContent>, versionId: string): TemplateContent {
  const content = contents.get(versionId);
  if (content === undefined) throw new HalfmarkError('not-found');
  return content;
}

/** A published version has been drawn from before it was published, so a seed that gives nothing is rare. */
const SEEDS_TRIED = 5;

function newDraw(content: TemplateContent): { seed: string; drawnValues: DrawnValues } {
  for (let tries = 1; tries <= SEEDS_TRIED; tries += 1) {
    const seed = randomBytes(16).toString('hex');
    const drawn = drawValues(content, seed);
    if (drawn.ok) return { seed, drawnValues: drawn.values };
    log.warn({ reason: drawn.error, seed }, 'a seed gave no draw');
  }
  throw new HalfmarkError(
    'unexpected',
    'This question could not be drawn for you. Please tell your instructor; nothing of yours was lost.',
  );
}
