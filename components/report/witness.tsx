import { DefinitionList } from '@/components/ui/definition-list';

export interface WitnessProps {
  readonly witness: {
    readonly values: Readonly<Record<string, string>>;
    /** "row 1, column 2"; empty for a scalar. */
    readonly element: string;
    readonly reference: string;
    readonly answer: string;
  };
}

/** Evidence that an answer differs: values of the symbols at which it and the reference come out unlike. After release only. */
export function Witness({ witness: { values, element, reference, answer } }: WitnessProps) {
  const at = Object.entries(values).map(([name, value]) => `${name} = ${value}`);
  return (
    <details className="mt-3 text-small">
      <summary className="min-h-6 text-blue">Numbers that show the difference</summary>
      <div className="mt-2 grid gap-2 border-l-2 border-hairline ps-4">
        <p>
          {at.length === 0 ? 'Worked out in numbers' : <>At {at.join(', ')}</>}
          {element === '' ? null : <>, {element}</>}:
        </p>
        <DefinitionList
          items={[
            { term: 'your answer', value: <span className="font-mono break-words">{answer}</span> },
            { term: 'the reference', value: <span className="font-mono break-words">{reference}</span> },
          ]}
        />
      </div>
    </details>
  );
}
