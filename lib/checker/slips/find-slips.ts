import { answerValue } from '../kinds/answer-value';
import { parse } from '../notation/parse';
import { catalogue } from './catalogue';
import { pairsOfSlips } from './pairs';
import { type Trial } from './slip';
import { quietly, SlipSearch } from './slip-search';

/**
 * Ids of every slip that fits: the author's own first, then the catalogue's in its order, then pairs of slips neither of
 * which fits alone. A slip fits where the changed reference agrees with the answer, exactly (the unchanged one is known
 * to differ).
 */
export function findSlips(trial: Trial): string[] {
  const found = authorSlips(trial);
  const search = new SlipSearch(trial);
  for (const slip of catalogue) {
    if (!found.includes(slip.id) && quietly(() => search.fits(slip))) found.push(slip.id);
  }
  return [...found, ...pairsOfSlips(search, found)];
}

function authorSlips({ request, context, answer, compare }: Trial): string[] {
  const { symbols = {}, options } = request;
  const found: string[] = [];
  for (const { id, expression } of options?.slips ?? []) {
    const { tree } = parse(expression, { kind: request.kind, symbols, options, allowReferenceFunctions: true });
    const agrees = (): boolean =>
      tree !== null && compare(answerValue(context.environment, request.kind, tree), answer);
    if (quietly(agrees)) found.push(id);
  }
  return found;
}
