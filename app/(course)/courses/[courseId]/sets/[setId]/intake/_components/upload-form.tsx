'use client';

import { useRouter } from 'next/navigation';
import { type FormEvent, useState } from 'react';
import { z } from 'zod';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';

const received = z.object({ intakeId: z.uuid() });
const refused = z.object({ detail: z.string(), fields: z.record(z.string(), z.string()).optional() });

interface UploadFormProps {
  readonly problemSetId: string;
  /** Where the sheet with the roster filled in is fetched. */
  readonly blankHref: string;
  /** The address of an upload's page, without its id. */
  readonly onward: string;
}

/** Uploads an answer sheet and goes to its preview; what is wrong with the file is said here, and nothing is kept. */
export function UploadForm({ problemSetId, blankHref, onward }: UploadFormProps) {
  const router = useRouter();
  const [sending, setSending] = useState(false);
  const [faults, setFaults] = useState<Record<string, string>>({});

  const upload = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    const file = form.get('file');
    if (!(file instanceof File) || file.size === 0) {
      setFaults({ file: 'Choose a file.' });
      return;
    }
    setSending(true);
    setFaults({});
    const result = await send(problemSetId, form);
    if ('intakeId' in result) router.push(onward + result.intakeId);
    else {
      setFaults(result.faults);
      setSending(false);
    }
  };

  return (
    <form onSubmit={(event) => void upload(event)} className="grid max-w-measure gap-4">
      <div className="text-small">
        <p>
          A CSV file, one row an answer, with the columns <code>student</code>, <code>question</code>, <code>part</code>{' '}
          and <code>answer</code>; further columns are passed over.
        </p>
        <pre className="mt-2 overflow-x-auto border-l-4 border-edge bg-wash px-3 py-2 font-mono text-note" tabIndex={0}>
          {'student,question,part,answer\nnoor.applewick@wrenfield.example,1,a,i hbar S_z\n'}
          {'noor.applewick@wrenfield.example,1,b,"hbar omega/2, -hbar omega/2"'}
        </pre>
        <p className="mt-2">
          UTF-8, or UTF-16 with a byte order mark; comma, semicolon or tab; up to 25 MB.{' '}
          <a href={blankHref} download>
            Download the sheet of this set with its roster filled in
          </a>
          .
        </p>
      </div>
      <FormErrorSummary errors={faults} />
      <Field name="file" label="Answer sheet" type="file" accept=".csv,.tsv,.txt,text/csv" error={faults.file} />
      <div>
        <Button look="primary" type="submit" pending={sending} pendingWords="Uploading">
          Upload and look at it
        </Button>
      </div>
      <p className="text-small text-grey">Nothing is taken in before you have seen every row and said so.</p>
    </form>
  );
}

async function send(
  problemSetId: string,
  form: FormData,
): Promise<{ intakeId: string } | { faults: Record<string, string> }> {
  try {
    const response = await fetch(`/api/intakes?set=${problemSetId}`, { method: 'POST', body: form });
    const body: unknown = await response.json();
    if (response.ok) return received.parse(body);
    const { detail, fields } = refused.parse(body);
    return { faults: fields && Object.keys(fields).length > 0 ? fields : { file: detail } };
  } catch {
    return {
      faults: { '': 'The upload was cut short before Halfmark had it all. Nothing was kept; please try again.' },
    };
  }
}
