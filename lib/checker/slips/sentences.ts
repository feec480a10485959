import { catalogue } from './catalogue';

const ofQuantities: readonly (readonly [string, string])[] = [
  ['power-of-ten', 'it is off by a power of ten'],
  ['wrong-unit', 'the number is right but the unit is not'],
];

const sentences: ReadonlyMap<string, string> = new Map([
  ...catalogue.map((slip) => [slip.id, slip.sentence] as const),
  ...ofQuantities,
]);

/** The sentence of a slip or of a pair of slips (`sign+factor-two`); an author's own is named by its id. */
export function sentenceOf(id: string): string {
  const parts = id.split('+').map((part) => sentences.get(part));
  return parts.every((part) => part !== undefined) ? parts.join(', and ') : `a mistake the author foresaw (${id})`;
}

/** Ids of the catalogue in its order. */
export const slipIds: readonly string[] = [...sentences.keys()];
