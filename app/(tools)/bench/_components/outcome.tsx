import { Typeset } from '@/components/math/typeset';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/script-page';
import { VerdictSign } from '@/components/ui/verdict-sign';
import { sentenceOf } from '@/lib/checker/index';
import { type CheckedPair } from '@/lib/jobs/check-many';
import { Elements } from './elements';
import { Evidence } from './evidence';

/** What the checker makes of a pair: both readings in the body, the verdict and what it rests on in the margin. */
export function Outcome({ pair }: { pair: CheckedPair }) {
  const { outcome, referenceLatex, readingPlain } = pair;
  if ('error' in outcome) {
    return (
      <Section label="Outcome">
        <Notice tone="error" title="Not checked">
          {outcome.error}
        </Notice>
      </Section>
    );
  }
  const { verdict, message, reading, slips, evidence } = outcome;
  return (
    <Section
      label="Outcome"
      margin={
        <div className="grid gap-4">
          <VerdictSign verdict={verdict} size="margin" />
          <Evidence response={outcome} />
        </div>
      }
    >
      <div className="grid gap-5">
        <p className="max-w-measure font-semibold">{message}</p>
        {referenceLatex ? <Shown words="Reference, worked out" latex={referenceLatex} /> : null}
        {reading ? <Shown words="Answer, read as" latex={reading} plain={readingPlain} /> : null}
        {evidence.elements ? <Elements elements={evidence.elements} /> : null}
        {slips.length > 0 ? (
          <div>
            <h2 className="mb-2">Slips that fit</h2>
            <ul className="grid gap-1">
              {slips.map((slip) => (
                <li key={slip}>
                  <span className="font-semibold">{slip}</span>: {sentenceOf(slip)}
                </li>
              ))}
            </ul>
          </div>
        ) : null}
      </div>
    </Section>
  );
}

function Shown({ words, latex, plain }: { words: string; latex: string; plain?: string }) {
  return (
    <div className="border-y border-hairline py-2.5">
      <p className="text-note text-grey">{words}</p>
      <div className="text-center">
        <Typeset latex={latex} plain={plain} display />
      </div>
    </div>
  );
}
