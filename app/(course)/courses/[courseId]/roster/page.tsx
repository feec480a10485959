import { CourseHead } from '@/app/_components/page-head';
import { openCoursePage } from '@/app/_server/course-page';
import { ButtonLink } from '@/components/ui/button';
import { DefinitionList } from '@/components/ui/definition-list';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { courseRoles } from '@/lib/domain/roles';
import { canChangeMembership } from '@/lib/policies/can-change-membership';
import { sectionBound } from '@/lib/policies/decide';
import { roster, sectionsOf } from '@/lib/queries/roster';
import { InviteForm } from './_components/invite-form';
import { RosterTable } from './_components/roster-table';
import { SectionForm } from './_components/section-form';

export const metadata = { title: 'Roster' };

type Props = { params: Promise<{ courseId: string }> };

/** Who is in a course, and the way in. */
export default async function RosterPage({ params }: Props) {
  const { actor, course, decision } = await openCoursePage(params, 'read-roster');
  const bound = sectionBound(actor, course, decision);
  const [people, sections] = await Promise.all([roster(course.id, bound), sectionsOf(course.id)]);
  const roles = courseRoles.filter(
    (to) => canChangeMembership(actor, course, { userId: null, from: null, to }).allowed,
  );
  const mayChange = roles.length > 0;
  return (
    <>
      <CourseHead actor={actor} course={course} here="roster" place="Roster" />
      <ScriptPage>
        <Section
          margin={
            <div className="grid gap-5">
              <Sections sections={sections} />
              {bound === null ? null : <MarginNote>You see the students of the sections you grade.</MarginNote>}
              {mayChange ? (
                <>
                  <div>
                    <ButtonLink look="primary" href="#bring-in">
                      Bring a person in
                    </ButtonLink>
                  </div>
                  <SectionForm courseId={course.id} />
                </>
              ) : null}
            </div>
          }
        >
          <PageTitle kicker={`${course.title}, ${course.term}`}>Roster</PageTitle>
          <RosterTable courseId={course.id} people={people} mayChange={mayChange} />
        </Section>
        {mayChange ? (
          <Section
            id="bring-in"
            label="Bring a person in"
            margin={
              <MarginNote>
                Somebody without an account is mailed an invitation to choose a password. Somebody who had left comes
                back to the work they had.
              </MarginNote>
            }
          >
            <h2 className="mb-3">Bring a person in</h2>
            <InviteForm courseId={course.id} roles={roles} sections={sections} />
          </Section>
        ) : null}
      </ScriptPage>
    </>
  );
}

function Sections({ sections }: { sections: readonly { id: string; name: string; students: number }[] }) {
  if (sections.length === 0) return <MarginNote>The course has no sections; everyone marks everything.</MarginNote>;
  const items = sections.map(({ name, students }) => ({
    term: name,
    value: students === 1 ? '1 student' : `${students} students`,
  }));
  return <DefinitionList items={items} />;
}
