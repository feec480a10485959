import { type Interval } from '@/lib/statistics/normal';
import { type MarkingAgreement } from '@/lib/statistics/marking-agreement';

/** A share as whole percents: "87 %". */
export function percent(share: number): string {
  return `${Math.round(share * 100)} %`.replace('-', '−');
}

/** A coefficient with two decimals and a true minus: "−0.04". */
export function coefficient(value: number): string {
  const text = value.toFixed(2);
  return (text === '-0.00' ? '0.00' : text).replace('-', '−');
}

/** An interval with its ends written by `write`. */
export function intervalText({ lower, upper }: Interval, write: (value: number) => string): string {
  return `${write(lower)} to ${write(upper)}`;
}

/** Kappa in a table: the figure, or that there is none. */
export function kappaText({ kappa }: MarkingAgreement): string {
  return kappa.defined ? coefficient(kappa.kappa) : 'not defined';
}

/** The interval of kappa in a table; a dash where it cannot be told. */
export function kappaIntervalText({ kappa, kappaIntervalHolds }: MarkingAgreement): string {
  return kappa.defined && kappaIntervalHolds ? intervalText(kappa.interval, coefficient) : 'cannot be told';
}

/** What the figures mean, and how far the number of pairs carries them, in plain sentences. */
export function agreementSentence(agreement: MarkingAgreement): string {
  if (agreement.agreement === null) return 'No answer has been marked twice yet, so nothing can be said.';
  return [sameSentence(agreement), kappaSentence(agreement), weightSentence(agreement)].filter(Boolean).join(' ');
}

function sameSentence({ pairs, same }: MarkingAgreement): string {
  if (pairs === 1) return `One answer was marked twice; the credits were ${same === 1 ? 'the same' : 'different'}.`;
  return `The same credit was given to ${same} of ${pairs} answers marked twice.`;
}

function kappaSentence({ kappa }: MarkingAgreement): string {
  if (!kappa.defined)
    return 'All got one and the same credit from both, so chance alone would agree: kappa is not defined.';
  if (kappa.kappa <= 0) return 'That is no more than chance would bring.';
  return `Of the agreement that chance would not bring, ${percent(kappa.kappa)} was reached.`;
}

function weightSentence({ pairs, weight }: MarkingAgreement): string {
  switch (weight) {
    case 'nothing':
    case 'enough':
      return '';
    case 'few':
      return `${pairs} pairs are few: take the intervals, not the figures.`;
    case 'very few':
      return `${pairs === 1 ? 'One pair is' : `${pairs} pairs are`} too few to judge anyone by.`;
  }
}
