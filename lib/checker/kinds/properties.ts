import { adjoint, identityTimes, multiplyOperators, type Operator } from '../algebra/operators';
import { type Property } from '../contract';
import { decideEqual } from '../equivalence/decide';
import { type Context } from './comparison';

/** Whether A† = A over the whole domain. */
export function isHermitian(context: Context, a: Operator): Property {
  return compared(context, adjoint(context.environment.g, a), a);
}

/** Whether A†A = 1 over the whole domain. */
export function isUnitary(context: Context, a: Operator): Property {
  const { g } = context.environment;
  return compared(context, multiplyOperators(g, adjoint(g, a), a), identityTimes(g, g.one));
}

function compared({ environment, points, seed }: Context, x: Operator, y: Operator): Property {
  const pairs = x.map((node, k) => [node, y[k]!] as const);
  const { status } = decideEqual(environment.g, pairs, points, seed);
  return status === 'equal' ? 'yes' : status === 'different' ? 'no' : 'undecided';
}
