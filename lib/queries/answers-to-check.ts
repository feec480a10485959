import { Answer } from '@/models/answer';
import { Draw } from '@/models/draw';
import { TemplateVersion } from '@/models/template-version';
import type { DrawnValues, TemplateContent } from '@/lib/templates/content';

/** An answer that waits for its verdict, with what its reference is made from. */
export type AnswerToCheck = {
  answerId: string;
  partKey: string;
  text: string;
  content: TemplateContent;
  values: DrawnValues;
};

/** Of the given answers, those that wait for a verdict, in the order of their ids. */
export async function answersToCheck(answerIds: readonly string[]): Promise<AnswerToCheck[]> {
  const answers = await Answer.findAll({
    where: { id: [...answerIds], checkState: 'waiting' },
    include: [
      {
        model: Draw,
        as: 'draw',
        required: true,
        include: [{ model: TemplateVersion, as: 'templateVersion', required: true }],
      },
    ],
    order: [['id', 'ASC']],
  });
  return answers.flatMap(({ id, partKey, text, draw }) =>
    draw?.templateVersion
      ? [{ answerId: id, partKey, text, content: draw.templateVersion.content, values: draw.drawnValues }]
      : [],
  );
}
