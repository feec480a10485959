import { check } from '@/lib/checker/index';
import { type AnswerKind, type CheckOptions, type CheckResponse, type SymbolTable } from '@/lib/checker/contract';

/** The response to one check; fails where the request itself is refused. */
export function ask(
  kind: AnswerKind,
  reference: string,
  answer: string,
  symbols: SymbolTable = {},
  options: CheckOptions = {},
): CheckResponse {
  const outcome = check({ id: 't', kind, reference, answer, symbols, options });
  if ('error' in outcome) throw new Error(outcome.error);
  return outcome;
}

export const verdictOf = (...request: Parameters<typeof ask>): string => ask(...request).verdict;
