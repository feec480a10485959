import { failureOf } from '../kinds/prepare';
import { type AnswerValue, answerValue } from '../kinds/answer-value';
import { type AnswerTree } from '../notation/answer-tree';
import { parse } from '../notation/parse';
import { catalogue } from './catalogue';
import { normalTree } from './normal-tree';
import { pairsOfSlips } from './pairs';
import { type Slip, type Trial } from './slip';

/**
 * Ids of every slip that fits: the author's own first, then the catalogue's in its order; where no single one fits, the
 * pairs. A slip fits where the changed reference agrees with the answer (the unchanged one is known to differ).
 */
export function findSlips(trial: Trial): string[] {
  const found = authorSlips(trial);
  let normal: AnswerTree | null | undefined;
  const forms = (): AnswerTree[] => {
    normal ??= normalTree(trial.context, trial.reference);
    return normal ? [trial.referenceTree, normal] : [trial.referenceTree];
  };
  for (const slip of catalogue) {
    if (!found.includes(slip.id) && fits(slip, trial, forms)) found.push(slip.id);
  }
  return found.length > 0 ? found : pairsOfSlips(trial);
}

function authorSlips({ request, context, answer, compare }: Trial): string[] {
  const { symbols = {}, options } = request;
  const found: string[] = [];
  for (const { id, expression } of options?.slips ?? []) {
    const { tree } = parse(expression, { kind: request.kind, symbols, options, allowReferenceFunctions: true });
    if (tree && quietly(() => compare(answerValue(context.environment, request.kind, tree), answer))) found.push(id);
  }
  return found;
}

function fits(slip: Slip, trial: Trial, forms: () => AnswerTree[]): boolean {
  switch (slip.type) {
    case 'value':
      return quietly(() => slip.change(trial.reference, trial).some((changed) => trial.compare(changed, trial.answer)));
    case 'test':
      return quietly(() => slip.fits(trial));
    case 'form':
      return forms().some((tree) => slip.change(tree).some((changed) => quietly(() => agreesChanged(trial, changed))));
  }
}

function agreesChanged({ request, context, answer, compare }: Trial, tree: AnswerTree): boolean {
  const changed: AnswerValue = answerValue(context.environment, request.kind, tree);
  return compare(changed, answer);
}

/** A changed reference may be defined nowhere or beyond what is worked out: then the slip does not fit. */
function quietly(test: () => boolean): boolean {
  try {
    return test();
  } catch (error) {
    if (failureOf(error).type === 'budget') throw error;
    return false;
  }
}
