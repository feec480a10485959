import { type Part } from './content';

/** A share of the part's credit in thousandths for one slip, or that a person decides; ids are as the checker names them. */
export type PartSlipCredit =
  { readonly slip: string; readonly share: number } | { readonly slip: string; readonly share: 'person' };

/** What the author gives for each slip of a part: for the expected wrong answers first, which outrank the catalogue. */
export function slipCreditsOf(part: Pick<Part, 'expected' | 'slips'>): PartSlipCredit[] {
  const all = [...part.expected.map((wrong) => ({ slip: wrong.id, share: wrong.share })), ...part.slips];
  return all.map(({ slip, share }) => (share === 'person' ? { slip, share } : { slip, share }));
}
