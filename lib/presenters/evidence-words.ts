import type { Evidence, Witness } from '@/lib/checker/contract';
import type { Verdict } from '@/lib/domain/verdict';

/** Names as they are read; the rest stand as they were declared. */
const names: Readonly<Record<string, string>> = {
  hbar: 'ħ',
  omega: 'ω',
  Omega: 'Ω',
  theta: 'θ',
  phi: 'φ',
  Delta: 'Δ',
  epsilon: 'ε',
  gamma: 'γ',
  omega_1: 'ω₁',
};

/**
 * What decided a check, as sentences for those who mark: the exact test with its bound, the witness with both sides, or
 * why it stayed open.
 */
export function evidenceInWords(verdict: Verdict, evidence: Evidence): string[] {
  const words = [decidedBy(verdict, evidence)];
  if (evidence.witness) words.push(witnessInWords(evidence.witness));
  if (evidence.tolerance) words.push(toleranceInWords(evidence));
  if (evidence.form === 'not evaluated') words.push('Something is left standing that was to be worked out.');
  if (evidence.hermitian) words.push(`Hermitian: ${evidence.hermitian}.`);
  if (evidence.unitary) words.push(`Unitary: ${evidence.unitary}.`);
  return words.filter((sentence) => sentence !== '');
}

function decidedBy(verdict: Verdict, { test, bound, fields, branches, points, reason, elements }: Evidence): string {
  switch (test) {
    case 'normal form':
      return 'Both sides reduce to the same form: an exact argument.';
    case 'modular':
    case 'modular and numeric':
      return (
        `Equal by an exact test in ${fields ?? 'several'} prime fields${boundInWords(bound)}` +
        (test === 'modular and numeric' ? `, with ${branchesInWords(branches, points)}.` : '.')
      );
    case 'witness':
    case 'high-precision witness':
      return differing(elements);
    case 'tolerance':
      return verdict === 'agrees' ? 'Within the tolerance of this part.' : 'Outside the tolerance of this part.';
    case 'dimension':
      return reason ? sentence(reason) : 'The units do not match.';
    case 'text':
      return 'Compared as a label.';
    // What could not be read is said by the check's own message.
    case 'reading':
      return '';
    case 'structure':
    case 'none':
      return reason ? sentence(reason) : '';
  }
}

function boundInWords(bound: number | undefined): string {
  if (bound === undefined || bound === 0) return '';
  return ` (chance of an error at most 10^${Math.ceil(Math.log10(bound))})`.replace('10^-', '10^−');
}

function branchesInWords(branches: number | undefined, points: number | undefined): string {
  const at = points === undefined ? 'numeric values' : `values at ${points} points`;
  return branches === undefined ? `${at} to settle signs` : `${at} to settle ${branches} branches of roots`;
}

function differing(elements: Evidence['elements']): string {
  if (!elements || elements.length === 0) return 'The two sides differ at a point of the domain.';
  const places = elements.map(([row, column]) =>
    column === undefined ? `component ${row}` : `row ${row}, column ${column}`,
  );
  return `${elements.length === 1 ? 'One element differs' : `${elements.length} elements differ`}: ${places.join('; ')}.`;
}

function witnessInWords({ values, element, reference, answer }: Witness): string {
  const at = Object.entries(values).map(([name, value]) => `${names[name] ?? name} = ${minus(value)}`);
  const where = at.length > 0 ? `At ${at.join(', ')} ` : '';
  const what = element === '' ? 'the answer' : `${element} of the answer`;
  const sides = `is ${minus(answer)}, that of the reference ${minus(reference)}`;
  return `${where}${where === '' ? capital(what) : what} ${sides}.`;
}

/** A true minus sign for the one that programs write. */
function minus(value: string): string {
  return value.replaceAll('-', '−');
}

function toleranceInWords({ tolerance, distance }: Evidence): string {
  const allowed = tolerance?.significantFigures
    ? `${tolerance.significantFigures} significant figures`
    : tolerance?.relative
      ? `${percent(tolerance.relative)} of the reference`
      : `${tolerance?.absolute ?? ''} in the reference’s unit`;
  return `Allowed: ${allowed}${distance === undefined ? '' : `; off by ${percent(distance)}`}.`;
}

function percent(share: number): string {
  return `${Number((100 * share).toPrecision(3))} %`;
}

function sentence(text: string): string {
  return `${capital(text.trim().replace(/\.$/, ''))}.`;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
