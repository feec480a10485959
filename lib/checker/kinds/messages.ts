import { type Evidence, type Verdict } from '../contract';
import { sentenceOf } from '../slips/sentences';

/** One sentence for a person about a verdict. */
export function messageOf(verdict: Verdict, evidence: Evidence, slip?: string): string {
  if (verdict === 'agrees') {
    return evidence.test === 'tolerance' ? 'The answer lies within the tolerance.' : 'The answer equals the reference.';
  }
  if (slip !== undefined) return `The answer differs from the reference: ${sentenceOf(slip)}.`;
  const { witness } = evidence;
  if (!witness) return 'The answer differs from the reference.';
  const where = witness.element === '' ? '' : ` in ${witness.element}`;
  const values = Object.entries(witness.values).map(([name, value]) => `${name} = ${value}`);
  const at = values.length === 0 ? '' : ` at ${values.join(', ')}`;
  return `The answer differs from the reference${where}${at}: ${witness.answer} where ${witness.reference} is right.`;
}
