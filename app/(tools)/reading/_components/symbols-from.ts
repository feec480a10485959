import { type SymbolTable } from '@/lib/checker/contract';

/** Letters with at most one index, as a template declares its symbols. */
const name = /^[A-Za-z][A-Za-z0-9]*(?:_[A-Za-z0-9]+)?$/;

/** The most symbols that are declared here at once; a template has no more either. */
const mostSymbols = 30;

/** Reads a list of names, separated by commas or blanks, as declared symbols; what is no name comes back by itself. */
export function symbolsFrom(text: string): { symbols: SymbolTable; faults: string[] } {
  const words = text
    .split(/[\s,;]+/)
    .filter(Boolean)
    .slice(0, mostSymbols);
  return {
    symbols: Object.fromEntries(words.filter((word) => name.test(word)).map((word) => [word, 'real'])),
    faults: words.filter((word) => !name.test(word)),
  };
}
