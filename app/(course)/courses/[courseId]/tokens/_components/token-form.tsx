'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Checkbox, Field, FieldGroup } from '@/components/ui/fields';
import { FieldErrorLine } from '@/components/ui/field-frame';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { tokenScopes, tokenScopeSentence } from '@/lib/domain/token-scopes';
import { makeToken } from '../actions';

/** Makes a token and shows it this once. */
export function TokenForm({ courseId }: { courseId: string }) {
  const { form, faults, result } = useActionForm(makeToken);
  return (
    <>
      {result?.ok ? <NewToken token={result.value.token} /> : null}
      <form {...form} className="grid gap-4">
        <FormErrorSummary errors={faults} title="No token was made" />
        <input type="hidden" name="courseId" value={courseId} />
        <Field
          name="name"
          label="What it is for"
          hint="Whoever finds it in this list later should know."
          error={faults['name']}
          maxLength={100}
        />
        <FieldGroup legend="It may">
          {tokenScopes.map((scope) => (
            <Checkbox
              key={scope}
              id={`scope-${scope}`}
              name="scopes[]"
              value={scope}
              label={tokenScopeSentence(scope)}
            />
          ))}
          <FieldErrorLine id="field-scopes" error={faults['scopes']} />
        </FieldGroup>
        <Field
          name="days"
          label="Days until it ends"
          type="number"
          min={1}
          max={365}
          defaultValue={90}
          error={faults['days']}
        />
        <div>
          <SubmitButton>Make a token</SubmitButton>
        </div>
      </form>
    </>
  );
}

function NewToken({ token }: { token: string }) {
  return (
    <div role="status" className="mb-6 max-w-measure border-l-4 border-verdigris bg-wash px-4 py-3">
      <p className="font-semibold">Here is the token. Copy it now: it is not shown again.</p>
      <p className="mt-2">
        <code className="break-all select-all">{token}</code>
      </p>
      <p className="mt-2 text-small text-grey">
        Programs send it as <code>Authorization: Bearer …</code>. Whoever has it can do what it may do: keep it as you
        keep a password.
      </p>
    </div>
  );
}
