import { dividePoints, type Thousandths } from '@/lib/domain/credit';
import type { TemplateContent } from './content';

/**
 * The full credit of a part: the item's points divided over its parts by weight, in thousandths of a mark.
 * Throws a RangeError for a part the template does not have.
 */
export function pointsOfPart(
  content: Pick<TemplateContent, 'parts'>,
  points: Thousandths,
  partKey: string,
): Thousandths {
  const shares = dividePoints(
    points,
    content.parts.map((part) => part.weight),
  );
  const share = shares[content.parts.findIndex((part) => part.key === partKey)];
  if (share === undefined) throw new RangeError(`The template has no part ${partKey}.`);
  return share;
}
