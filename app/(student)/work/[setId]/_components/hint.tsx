import { type PartReading } from '@/lib/templates/read-answer';

/** What is asked for, by kind, without giving the form of the answer away. */
const kinds: Record<PartReading['kind'], string> = {
  scalar: 'An expression',
  quantity: 'A number with its unit',
  operator: 'An operator, as a matrix or in symbols',
  pauli: 'Pauli coefficients, or the operator itself',
  eigenvalues: 'Eigenvalues, in any order',
  state: 'A state, as kets or as components',
  eigenpairs: 'Eigenvalues, each with its state',
  vector: 'A vector by its components',
  choice: 'One of the choices',
};

/** The line below an answer field: the kind of answer, and the symbols that the question declares. */
export function Hint({ reading: { kind, symbols } }: { reading: PartReading }) {
  const names = kind === 'quantity' ? [] : Object.keys(symbols);
  return (
    <>
      {kinds[kind]}.
      {names.length > 0 ? (
        <>
          {' '}
          Declared here:{' '}
          {names.map((name, index) => (
            <span key={name}>
              {index > 0 ? ', ' : null}
              <code>{name}</code>
            </span>
          ))}
          .
        </>
      ) : null}
    </>
  );
}
