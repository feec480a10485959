import { DataTable, type TableRow } from '@/components/ui/data-table';
import { formatTime } from '@/components/ui/time-stamp';
import { paths } from '@/lib/paths';
import { type ReleaseOverview, type ReleaseStudent } from '@/lib/queries/release-overview';

/** Every student of the set: what waits, who is held back, whose scores are out; the name leads to the report. */
export function ReleaseTable({ overview: { course, set, students, named } }: { overview: ReleaseOverview }) {
  return (
    <DataTable
      caption={named ? 'Students' : 'Students, without names until release'}
      columns={columns}
      rows={students.map((student) => row(student, course, set.id))}
      empty="The course has no students."
    />
  );
}

const columns = [
  { key: 'student', label: 'Student', heading: true },
  { key: 'section', label: 'Section' },
  { key: 'waiting', label: 'Parts waiting', align: 'end' },
  { key: 'state', label: 'Scores' },
] as const;

function row(student: ReleaseStudent, course: ReleaseOverview['course'], setId: string): TableRow {
  const state = stateInWords(student, course.timeZone);
  return {
    id: student.userId,
    cells: {
      student: {
        value: student.label,
        node: <span className="whitespace-nowrap">{student.label}</span>,
        href: paths.reportOf(course.id, setId, student.userId),
      },
      section: student.sectionName,
      waiting: { value: student.partsWaiting, text: student.partsWaiting === 0 ? '' : String(student.partsWaiting) },
      state: { value: state, node: <span className="whitespace-nowrap">{state}</span> },
    },
  };
}

function stateInWords({ releasedAt, extendedUntil, partsWaiting }: ReleaseStudent, zone: string): string {
  if (releasedAt) return `released ${formatTime(releasedAt, zone, 'short')}`;
  if (extendedUntil) return `held back, extended to ${formatTime(extendedUntil, zone, 'short')}`;
  return partsWaiting === 0 ? 'ready' : 'waits for marking';
}
