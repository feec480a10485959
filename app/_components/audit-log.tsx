import { z } from 'zod';
import { DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/states';
import { Pager } from '@/components/ui/pager';
import { TimeStamp } from '@/components/ui/time-stamp';
import { inWords, presentAuditDetails } from '@/lib/presenters/audit-details';
import { auditActions, auditEvents, auditLinesPerPage, type AuditLine } from '@/lib/queries/audit-events';
import { AuditFilterForm, type AuditQuery } from './audit-filter-form';

const day = z.iso.date().optional().catch(undefined);
const text = z.string().trim().min(1).max(100).optional().catch(undefined);

const querySchema = z.object({
  action: text,
  who: text,
  from: day,
  until: day,
  page: z.coerce.number().int().min(1).max(100_000).catch(1),
});

type Props = {
  /** The course whose log it is; null for the whole log. The page has authorised already. */
  courseId: string | null;
  timeZone: string;
  path: string;
  searchParams: Promise<Record<string, string | string[] | undefined>>;
};

/** The audit log with its filter, a page at a time; what the address holds and cannot be is left out. */
export async function AuditLog({ courseId, timeZone, path, searchParams }: Props) {
  const { page, ...query } = querySchema.parse(await searchParams);
  const [{ lines, total }, actions] = await Promise.all([
    auditEvents({ courseId, timeZone, page, ...query }),
    auditActions(courseId),
  ]);
  return (
    <>
      <AuditFilterForm path={path} query={query} actions={actions} />
      <div className="mt-5">
        <DataTable
          caption={`Events, latest first (times of ${timeZone})`}
          columns={columns.filter((column) => courseId === null || column.key !== 'course')}
          rows={lines.map((line) => rowOf(line, timeZone))}
          filterLabel={null}
          empty={<EmptyState title="Nothing was recorded that fits.">Widen the filter, or clear it.</EmptyState>}
        />
        <Pager
          page={page}
          pageCount={Math.ceil(total / auditLinesPerPage)}
          hrefFor={(number) => `${path}?${addressOf(query, number)}`}
          label="the log"
        />
      </div>
    </>
  );
}

function rowOf(line: AuditLine, timeZone: string) {
  const details = presentAuditDetails(line.details);
  return {
    id: line.id,
    cells: {
      at: { value: line.id, node: <TimeStamp at={line.at} zone={timeZone} style="short" /> },
      who: line.who,
      action: inWords(line.action),
      subject: line.subject === null ? '' : `${inWords(line.subjectKind ?? '')} ${line.subject}`,
      course: line.courseCode ?? '',
      details: { value: details.join('; '), node: <Details lines={details} /> },
    },
  };
}

function Details({ lines }: { lines: readonly string[] }) {
  return lines.map((line) => (
    <span key={line} className="block">
      {line}
    </span>
  ));
}

function addressOf(query: AuditQuery, page: number): string {
  const given = Object.entries(query).filter((entry): entry is [string, string] => entry[1] !== undefined);
  return new URLSearchParams([...given, ['page', String(page)]]).toString();
}

const columns = [
  { key: 'at', label: 'When', sortable: false },
  { key: 'who', label: 'Who', sortable: false },
  { key: 'action', label: 'Did', sortable: false },
  { key: 'subject', label: 'To', sortable: false },
  { key: 'course', label: 'Course', sortable: false },
  { key: 'details', label: 'Details', sortable: false },
] as const;
