import { z } from 'zod';
import { type SymbolTable } from '@/lib/checker/contract';
import { checkRequestSchema } from '@/lib/http-api/check-schemas';

const domains = ['real', 'positive', 'nonnegative', 'nonzero', 'integer', 'complex'] as const;
const name = /^[A-Za-z][A-Za-z0-9]*(?:_[A-Za-z0-9]+)?$/;

/** Kinds that the bench takes: all but the choice, which has nothing to read. */
export const benchKinds = checkRequestSchema.shape.kind.exclude(['choice']);

/** What stands in the address of the bench; everything may be missing. */
export const benchInputSchema = z.object({
  kind: benchKinds.catch('operator'),
  symbols: z.string().max(2000).catch(''),
  reference: z.string().max(4000).catch(''),
  answer: z.string().max(8000).catch(''),
  upToPhase: z.literal('on').optional().catch(undefined),
});

export type BenchInput = z.output<typeof benchInputSchema>;

/**
 * Reads declared symbols, separated by commas: `omega positive, n integer, theta between 0 and pi, t`. A name alone is
 * real. What is no declaration comes back by itself.
 */
export function declarationsIn(text: string): { symbols: SymbolTable; faults: string[] } {
  const symbols: Record<string, SymbolTable[string]> = {};
  const faults: string[] = [];
  for (const declaration of text
    .split(/[,;\n]+/)
    .map((piece) => piece.trim())
    .filter(Boolean)) {
    const [symbol = '', ...rest] = declaration.split(/[\s:]+/);
    const domain = domainOf(rest.join(' '));
    if (name.test(symbol) && domain !== null) symbols[symbol] = domain;
    else faults.push(declaration);
  }
  return { symbols, faults };
}

function domainOf(words: string): SymbolTable[string] | null {
  const between = /^between (.+) and (.+)$/.exec(words);
  if (between) return { between: [between[1] ?? '', between[2] ?? ''] };
  return words === '' ? 'real' : (domains.find((domain) => domain === words) ?? null);
}
