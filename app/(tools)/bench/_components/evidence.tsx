import { DefinitionList, type Definition } from '@/components/ui/definition-list';
import { type CheckResponse, type Evidence as EvidenceOf } from '@/lib/checker/contract';

/** What a verdict rests on: the test and its bound, the witness with both values, or why nothing could be decided. */
export function Evidence({ response }: { response: CheckResponse }) {
  const { evidence } = response;
  return (
    <div className="grid gap-4">
      <DefinitionList items={linesOf(evidence)} />
      {evidence.witness ? <Witness witness={evidence.witness} /> : null}
    </div>
  );
}

function linesOf(evidence: EvidenceOf): Definition[] {
  const { test, bound, fields, degree, branches, points, reason, form, hermitian, unitary, distance } = evidence;
  const lines: readonly (readonly [string, string | number | undefined])[] = [
    ['decided by', test === 'none' ? 'nothing' : test],
    ['error bound', bound === undefined ? undefined : `at most ${bound.toExponential(1).replace('-', '−')}`],
    ['prime fields', fields],
    ['degree', degree],
    ['branches', branches],
    ['points tried', points],
    ['reason', reason],
    ['form', form],
    ['Hermitian', hermitian],
    ['unitary', unitary],
    ['relative distance', distance?.toPrecision(3)],
  ];
  return lines.flatMap(([term, value]) => (value === undefined ? [] : [{ term, value }]));
}

function Witness({ witness }: { witness: NonNullable<EvidenceOf['witness']> }) {
  const values = Object.entries(witness.values);
  return (
    <div className="text-small">
      <p className="mb-1">
        {values.length === 0
          ? 'The two have these values'
          : `At ${values.map(([name, value]) => `${name} = ${value}`).join(', ')} the two have these values`}
        {witness.element ? `, in ${witness.element}` : ''}:
      </p>
      <DefinitionList
        items={[
          { term: 'reference', value: <span className="font-mono">{witness.reference}</span> },
          { term: 'answer', value: <span className="font-mono">{witness.answer}</span> },
        ]}
      />
    </div>
  );
}
