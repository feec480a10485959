import { AdminHead } from '@/app/(admin)/_components/admin-head';
import { openAdminPage } from '@/app/_server/admin-page';
import { DataTable } from '@/components/ui/data-table';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { paths } from '@/lib/paths';
import { allCourses, departmentNames } from '@/lib/queries/all-courses';
import { NewCourseForm } from './_components/new-course-form';

export const metadata = { title: 'All courses' };

/** Every course, and the making of one. */
export default async function AdminCoursesPage() {
  const actor = await openAdminPage('manage-courses');
  const [courses, departments] = await Promise.all([allCourses(), departmentNames()]);
  const rows = courses.map((course) => ({
    id: course.id,
    cells: {
      code: { value: course.code, href: paths.adminCourse(course.id) },
      title: course.title,
      term: course.term,
      department: course.department,
      instructors: course.instructors.join(', ') || 'none yet',
      students: course.students,
    },
  }));
  return (
    <>
      <AdminHead actor={actor} here="courses" place="Courses" />
      <ScriptPage>
        <Section>
          <PageTitle>Courses</PageTitle>
          <DataTable
            caption="All courses"
            columns={columns}
            rows={rows}
            empty={<EmptyState title="No courses yet.">Make the first one below.</EmptyState>}
          />
        </Section>
        <Section
          label="Make a course"
          margin={<MarginNote>Next you bring in its instructor, who does the rest.</MarginNote>}
        >
          <h2 className="mb-3">Make a course</h2>
          <NewCourseForm departments={departments} />
        </Section>
      </ScriptPage>
    </>
  );
}

const columns = [
  { key: 'code', label: 'Course', heading: true },
  { key: 'title', label: 'Title' },
  { key: 'term', label: 'Term' },
  { key: 'department', label: 'Department' },
  { key: 'instructors', label: 'Instructors' },
  { key: 'students', label: 'Students', align: 'end' },
] as const;
