import { z } from 'zod';
import { type ProblemSet } from '@/models/problem-set';
import { ProblemSetItem } from '@/models/problem-set-item';
import { TemplateVersion } from '@/models/template-version';
import { hasBegun } from '@/lib/domain/problem-set-change';
import { HalfmarkError } from '@/lib/errors';
import { canReadTemplate } from '@/lib/policies/can-read-template';
import { requireAllowed } from '@/lib/policies/decide';
import { templateForPolicy } from '@/lib/queries/template-for-policy';
import { type ServiceContext } from './context';
import { loadSetForEdit } from './load-set-for-edit';
import { recordAuditEvent } from './record-audit-event';

const points = z
  .int('Points are marks with at most three decimals.')
  .min(1, 'An item is worth more than nothing.')
  .max(1_000_000_000, 'At most one million marks.');

/** Every input names the set and the revision that the editor saw; points are thousandths of a mark. */
const ofSet = { problemSetId: z.uuid(), revision: z.int().positive() };
export const addItemInput = z.object({ ...ofSet, templateVersionId: z.uuid(), points });
export const setItemPointsInput = z.object({ ...ofSet, itemId: z.uuid(), points });
export const removeItemInput = z.object({ ...ofSet, itemId: z.uuid() });
export const orderItemsInput = z.object({ ...ofSet, itemIds: z.array(z.uuid()).min(1).max(999) });

type Revised = { revision: number };

/** Puts a published template version at the end of a set that students have not seen yet. */
export async function addItem(
  context: ServiceContext,
  input: z.output<typeof addItemInput>,
): Promise<Revised & { itemId: string }> {
  const { transaction, actor } = context;
  const set = await loadUnseen(context, input);
  const version = await TemplateVersion.findByPk(input.templateVersionId, { transaction });
  if (version === null) throw new HalfmarkError('not-found', 'That template version is not on the shelf any more.');
  requireAllowed(canReadTemplate(actor, await templateForPolicy(version.templateId, transaction)));
  const last = await ProblemSetItem.max<number | null, ProblemSetItem>('position', {
    where: { problemSetId: set.id },
    transaction,
  });
  const item = await ProblemSetItem.create(
    {
      problemSetId: set.id,
      position: (last ?? 0) + 1,
      templateVersionId: version.id,
      points: input.points,
    },
    { transaction },
  );
  const details = { itemId: item.id, templateVersionId: version.id, points: input.points };
  return { itemId: item.id, ...(await revise(context, set, 'add-item', details)) };
}

/** Changes the points of an item, in thousandths of a mark. */
export async function setItemPoints(
  context: ServiceContext,
  input: z.output<typeof setItemPointsInput>,
): Promise<Revised> {
  const set = await loadUnseen(context, input);
  const item = await itemOf(context, set, input.itemId);
  const details = { itemId: item.id, from: item.points, to: input.points };
  await item.update({ points: input.points }, { transaction: context.transaction });
  return revise(context, set, 'change-item-points', details);
}

/** Takes an item out of a set that students have not seen yet; the rest close up. */
export async function removeItem(context: ServiceContext, input: z.output<typeof removeItemInput>): Promise<Revised> {
  const set = await loadUnseen(context, input);
  const item = await itemOf(context, set, input.itemId);
  const left = (await itemsOf(context, set)).filter((other) => other.id !== item.id);
  if (set.state === 'open' && left.length === 0) {
    throw new HalfmarkError('wrong-state', 'The set opens by itself, so it keeps at least one question.');
  }
  await item.destroy({ transaction: context.transaction });
  await place(
    context,
    left.map((other) => other.id),
  );
  return revise(context, set, 'remove-item', { itemId: input.itemId, templateVersionId: item.templateVersionId });
}

/** Puts the items into the given order, which names each of them once. */
export async function orderItems(context: ServiceContext, input: z.output<typeof orderItemsInput>): Promise<Revised> {
  const set = await loadUnseen(context, input);
  const present = (await itemsOf(context, set)).map((item) => item.id);
  const given = new Set(input.itemIds);
  if (given.size !== present.length || input.itemIds.length !== present.length || !present.every((id) => given.has(id)))
    throw new HalfmarkError('conflict');
  await place(context, input.itemIds);
  return revise(context, set, 'order-items', { itemIds: input.itemIds });
}

async function loadUnseen(
  context: ServiceContext,
  input: { problemSetId: string; revision: number },
): Promise<ProblemSet> {
  const { set } = await loadSetForEdit(context, input);
  if (hasBegun(set, context.now)) {
    throw new HalfmarkError(
      'wrong-state',
      'Students have this set in front of them, so its questions and points stay as they are.',
    );
  }
  return set;
}

async function itemOf({ transaction }: ServiceContext, set: ProblemSet, itemId: string): Promise<ProblemSetItem> {
  const item = await ProblemSetItem.findOne({ where: { id: itemId, problemSetId: set.id }, transaction });
  if (item === null) throw new HalfmarkError('conflict', 'That question is not in the set any more. Reload the page.');
  return item;
}

function itemsOf({ transaction }: ServiceContext, set: ProblemSet): Promise<ProblemSetItem[]> {
  return ProblemSetItem.findAll({ where: { problemSetId: set.id }, order: [['position', 'asc']], transaction });
}

/** Numbers the items from 1 in the given order; the unique positions are checked once all are moved. */
async function place({ transaction }: ServiceContext, itemIds: readonly string[]): Promise<void> {
  const database = ProblemSetItem.sequelize;
  await database?.query('set constraints problem_set_items_position_unique deferred', { transaction });
  for (const [index, id] of itemIds.entries()) {
    await ProblemSetItem.update({ position: index + 1 }, { where: { id }, transaction });
  }
  await database?.query('set constraints problem_set_items_position_unique immediate', { transaction });
}

async function revise(
  context: ServiceContext,
  set: ProblemSet,
  action: string,
  details: Record<string, unknown>,
): Promise<Revised> {
  const revision = set.revision + 1;
  await set.update({ revision }, { transaction: context.transaction });
  await recordAuditEvent(context, {
    action,
    courseId: set.courseId,
    subject: { kind: 'problem-set', id: set.id },
    details,
  });
  return { revision };
}
