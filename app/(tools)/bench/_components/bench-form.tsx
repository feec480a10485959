import { Button } from '@/components/ui/button';
import { Checkbox, Field, Select, TextArea } from '@/components/ui/fields';
import { answerKindNames } from '@/lib/presenters/kind-name';
import { paths } from '@/lib/paths';
import { type BenchInput } from './bench-input';

const kinds = answerKindNames
  .filter(({ kind }) => kind !== 'choice')
  .map(({ kind, name }) => ({ value: kind, label: name }));

/** The fields of the bench. It is sent by address, so that a pair can be passed on as a link. */
export function BenchForm({ input, faults }: { input: BenchInput; faults: readonly string[] }) {
  return (
    <form action={paths.bench()} method="get" className="grid gap-4" key={JSON.stringify(input)}>
      <Select name="kind" label="Kind of answer" options={kinds} defaultValue={input.kind} />
      <Field
        name="symbols"
        label="Declared symbols"
        mono
        optional
        hint="Names with their domains: omega positive, n integer, theta between 0 and pi. A name alone is real."
        defaultValue={input.symbols}
        error={faults.length > 0 ? `These are no declarations: ${faults.join('; ')}.` : undefined}
        autoComplete="off"
        spellCheck={false}
      />
      <TextArea name="reference" label="Reference" mono rows={2} defaultValue={input.reference} spellCheck={false} />
      <TextArea name="answer" label="Answer" mono rows={2} defaultValue={input.answer} spellCheck={false} />
      <Checkbox
        name="upToPhase"
        label="Up to a phase"
        hint="For states and operators."
        defaultChecked={input.upToPhase === 'on'}
      />
      <div>
        <Button type="submit" look="primary">
          Check
        </Button>
      </div>
    </form>
  );
}
