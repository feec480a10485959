import { type Transaction } from 'sequelize';
import { SavedAnswer } from '@/models/saved-answer';

/** What was last saved of a part, handed in or not. */
export type SavedRow = { drawId: string; partKey: string; text: string; revision: number; savedAt: Date };

/** What a student has typed for the parts of the given draws. */
export async function savedAnswers(drawIds: readonly string[], transaction?: Transaction): Promise<SavedRow[]> {
  const rows = await SavedAnswer.findAll({ where: { drawId: [...drawIds] }, transaction });
  return rows.map(({ drawId, partKey, text, revision, savedAt }) => ({ drawId, partKey, text, revision, savedAt }));
}
