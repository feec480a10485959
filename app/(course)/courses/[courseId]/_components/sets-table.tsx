import { SetState } from '@/app/(course)/_components/set-state';
import { DataTable, type TableRow } from '@/components/ui/data-table';
import { formatCredit } from '@/lib/domain/credit';
import { problemSetStates } from '@/lib/domain/problem-set-state';
import { paths } from '@/lib/paths';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { type SetOfCourse } from '@/lib/queries/sets-of-course';

interface SetsTableProps {
  readonly course: CourseView;
  readonly sets: readonly SetOfCourse[];
  readonly students: number;
  readonly now: Date;
}

/** The sets of a course, each leading to its page. */
export function SetsTable({ course, sets, students, now }: SetsTableProps) {
  const rows = sets.map((set): TableRow => ({
    id: set.id,
    cells: {
      number: set.number,
      title: { value: set.title, href: paths.set(course.id, set.id) },
      state: {
        value: problemSetStates.indexOf(set.state),
        node: <SetState set={set} zone={course.timeZone} now={now} />,
      },
      points: { value: set.points, node: formatCredit(set.points) },
      answered: { value: set.answeredBy, node: `${set.answeredBy} of ${students}` },
      waiting: { value: set.waiting, node: set.waiting === 0 ? '–' : String(set.waiting) },
    },
  }));
  return (
    <DataTable
      caption="Problem sets"
      columns={[
        { key: 'number', label: 'Set', align: 'end' },
        { key: 'title', label: 'Title', heading: true },
        { key: 'state', label: 'State' },
        { key: 'points', label: 'Points', align: 'end' },
        { key: 'answered', label: 'Answered', align: 'end' },
        { key: 'waiting', label: 'Waiting', align: 'end' },
      ]}
      rows={rows}
      filterLabel={sets.length > 12 ? 'Filter' : null}
    />
  );
}
