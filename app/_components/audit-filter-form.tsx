import Form from 'next/form';
import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { Field, Select } from '@/components/ui/fields';
import { inWords } from '@/lib/presenters/audit-details';

/** What the log is narrowed to, as it stands in the address. */
export type AuditQuery = { action?: string; who?: string; from?: string; until?: string };

type Props = { path: string; query: AuditQuery; actions: readonly string[] };

/** Narrows the log; the choice is in the address, so that it can be kept and passed on. */
export function AuditFilterForm({ path, query, actions }: Props) {
  return (
    <Form action={path} className="no-print grid gap-x-5 gap-y-3 sm:grid-cols-2 lg:grid-cols-[1fr_1fr_auto_auto]">
      <Select
        name="action"
        label="What was done"
        optional
        empty="anything"
        defaultValue={query.action ?? ''}
        options={actions.map((action) => ({ value: action, label: inWords(action) }))}
      />
      <Field name="who" label="By whom" optional defaultValue={query.who ?? ''} maxLength={100} />
      <Field name="from" label="From" type="date" optional defaultValue={query.from ?? ''} />
      <Field name="until" label="Until" type="date" optional defaultValue={query.until ?? ''} />
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2 sm:col-span-full">
        <Button type="submit">Narrow the log</Button>
        {Object.values(query).some((value) => value !== undefined) ? <Link href={path}>Clear the filter</Link> : null}
      </div>
    </Form>
  );
}
