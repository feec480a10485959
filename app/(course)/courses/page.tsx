import { redirect } from 'next/navigation';
import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { DataTable } from '@/components/ui/data-table';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { isStaffRole, roleName } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { coursesOfActor } from '@/lib/queries/courses-of-actor';

export const metadata = { title: 'Courses' };

/** The courses a person teaches or marks in; someone who is only a student is led to their work. */
export default async function CoursesPage() {
  const actor = await requireActor();
  const all = await coursesOfActor(actor);
  const taught = all.filter((course) => isStaffRole(course.role));
  if (taught.length === 0 && all.length > 0) redirect(paths.work());
  const rows = taught.map((course) => ({
    id: course.id,
    cells: {
      code: { value: course.code, href: paths.course(course.id) },
      title: course.title,
      term: course.term,
      role: roleName(course.role),
      students: course.students,
      open: course.openSets,
    },
  }));
  return (
    <>
      <SiteHead actor={actor} here="courses" place="Courses" />
      <ScriptPage>
        <Section
          margin={all.length > taught.length ? <MarginNote>Courses you take are under “My work”.</MarginNote> : null}
        >
          <PageTitle kicker={actor.name}>Courses</PageTitle>
          {rows.length === 0 ? (
            <EmptyState title="You are in no course yet.">
              Whoever runs a course can bring you in with the address of your account.
            </EmptyState>
          ) : (
            <DataTable
              caption="Courses you work in"
              columns={columns}
              rows={rows}
              filterLabel={rows.length > 8 ? 'Filter' : null}
            />
          )}
        </Section>
      </ScriptPage>
    </>
  );
}

const columns = [
  { key: 'code', label: 'Course', heading: true },
  { key: 'title', label: 'Title' },
  { key: 'term', label: 'Term' },
  { key: 'role', label: 'Your role' },
  { key: 'students', label: 'Students', align: 'end' },
  { key: 'open', label: 'Open sets', align: 'end' },
] as const;
