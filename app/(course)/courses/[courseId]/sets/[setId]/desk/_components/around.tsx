import { TimeStamp } from '@/components/ui/time-stamp';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { formatCredit } from '@/lib/domain/credit';
import type { CreditStep, SiblingPart } from '@/lib/queries/answer-for-marking';
import type { Verdict } from '@/lib/domain/verdict';

interface OtherPartsProps {
  readonly parts: readonly SiblingPart[];
  readonly attempts: readonly { attempt: number; text: string; verdict: Verdict | null }[];
}

/** Where the same student's other parts of the question stand, and what was tried before. */
export function OtherParts({ parts, attempts }: OtherPartsProps) {
  return (
    <>
      {parts.length > 0 ? (
        <section aria-labelledby="other-parts" className="text-small">
          <h2 id="other-parts">Other parts</h2>
          <ul>
            {parts.map(({ partKey, verdict, credit, outOf, waits }) => (
              <li key={partKey} className="flex gap-3">
                <span className="w-4">{partKey}</span>
                {verdict ? <VerdictSign verdict={verdict} /> : <span className="text-grey">not checked yet</span>}
                <span className="text-grey">
                  {waits
                    ? 'waits'
                    : credit !== null && outOf !== null
                      ? `${formatCredit(credit)} of ${formatCredit(outOf)}`
                      : ''}
                </span>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      {attempts.length > 0 ? (
        <section aria-labelledby="earlier" className="text-small">
          <h2 id="earlier">Earlier attempts</h2>
          <ol>
            {attempts.map(({ attempt, text, verdict }) => (
              <li key={attempt} className="min-w-0">
                {attempt}. <code className="break-words">{text}</code>{' '}
                {verdict ? <VerdictSign verdict={verdict} /> : null}
              </li>
            ))}
          </ol>
        </section>
      ) : null}
    </>
  );
}

const sources: Record<CreditStep['source'], string> = {
  'no-answer': 'no answer',
  automatic: 'by the set’s policy',
  rule: 'by a rule of the set',
  ruling: 'ruling',
  'kin-ruling': 'ruling on kin',
  settlement: 'settled',
  appeal: 'on appeal',
  recheck: 'checked again',
  reversal: 'taken back',
};

/** The history of an answer's credit: who or what gave it, when and why. */
export function History({ steps, zone }: { steps: readonly CreditStep[]; zone: string }) {
  if (steps.length === 0) return null;
  return (
    <section aria-labelledby="history" className="text-small">
      <h2 id="history">History</h2>
      <ol>
        {steps.map(({ credit, outOf, source, by, reason, at }) => (
          <li key={`${source} ${at.toISOString()}`}>
            {formatCredit(credit)} of {formatCredit(outOf)}, {sources[source]}
            {by ? ` (${by})` : ''} <TimeStamp at={at} zone={zone} />
            {reason ? <span className="block text-grey">{reason}</span> : null}
          </li>
        ))}
      </ol>
    </section>
  );
}
