import { type Node } from '../algebra/graph';
import { type Comparison, compareElements, type Context } from './comparison';

/** Equal for every value of the symbols in their domains. */
export function compareScalars(context: Context, reference: Node, answer: Node): Comparison {
  return compareElements(context, [{ pair: [reference, answer], label: '', place: [] }]);
}
