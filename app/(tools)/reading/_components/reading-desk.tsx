'use client';

import { useState } from 'react';
import { AnswerField } from '@/components/math/answer-field';
import { Field, Select } from '@/components/ui/fields';
import { PageTitle, Section } from '@/components/ui/script-page';
import { type AnswerKind } from '@/lib/checker/contract';
import { read } from '@/lib/checker/reader';
import { Spellings } from './spellings';
import { symbolsFrom } from './symbols-from';

const kinds: readonly { value: Exclude<AnswerKind, 'choice'>; label: string }[] = [
  { value: 'scalar', label: 'An expression' },
  { value: 'operator', label: 'An operator' },
  { value: 'eigenvalues', label: 'Eigenvalues' },
  { value: 'state', label: 'A state' },
  { value: 'eigenpairs', label: 'Eigenvalues with states' },
  { value: 'vector', label: 'A vector' },
  { value: 'pauli', label: 'Pauli coefficients' },
  { value: 'quantity', label: 'A number with a unit' },
];

/** A field to type in, for any kind of answer and any declared symbols, and how the reader reads it. */
export function ReadingDesk() {
  const [kind, setKind] = useState<AnswerKind>('operator');
  const [declared, setDeclared] = useState('omega, theta, t');
  const [tried, setTried] = useState({ text: '', count: 0 });
  const { symbols, faults } = symbolsFrom(declared);
  return (
    <>
      <Section
        margin={
          <div className="grid gap-4">
            <Select
              name="kind"
              label="Kind of answer"
              options={kinds}
              value={kind}
              onChange={(event) => setKind(event.target.value as AnswerKind)}
            />
            <Field
              name="symbols"
              label="Declared symbols"
              mono
              optional
              value={declared}
              onChange={(event) => setDeclared(event.target.value)}
              error={
                faults.length > 0
                  ? `These are no names: ${faults.join(' ')}. A name is letters, with at most one index, such as omega or B_0.`
                  : undefined
              }
              autoComplete="off"
              spellCheck={false}
            />
          </div>
        }
      >
        <PageTitle>Try a reading</PageTitle>
        <p className="mb-4 max-w-measure text-grey">
          Type mathematics the way you write it: plain, with Greek and other signs, or in LaTeX. It is shown back as it
          is read, never worked out. Nothing typed here is kept or sent.
        </p>
        <AnswerField
          key={tried.count}
          name="reading"
          label="Mathematics to read"
          kind={kind}
          symbols={symbols}
          defaultValue={tried.text}
          read={read}
        />
      </Section>
      <Section>
        <h2 className="mb-3">Spellings</h2>
        <Spellings
          onTry={(example) => {
            setKind(example.kind);
            setDeclared(example.symbols);
            setTried((before) => ({ text: example.text, count: before.count + 1 }));
            document.getElementById('main')?.scrollIntoView({ block: 'start' });
          }}
        />
      </Section>
    </>
  );
}
