import { ActionButton } from '@/app/_components/action-button';
import { CourseHead } from '@/app/_components/page-head';
import { openCoursePage } from '@/app/_server/course-page';
import { pageOf } from '@/app/_server/page';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { Notice } from '@/components/ui/notice';
import { courseRoles, roleName } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { canChangeMembership } from '@/lib/policies/can-change-membership';
import { rosterPerson } from '@/lib/queries/roster-person';
import { sectionsOf } from '@/lib/queries/roster';
import { inviteAgain, letLeave } from '../actions';
import { PlaceForm } from './_components/place-form';

export const metadata = { title: 'Roster' };

type Props = { params: Promise<{ courseId: string; membershipId: string }> };

/** One person's place in a course: role, sections, leaving. */
export default async function RosterPersonPage({ params }: Props) {
  const { actor, course, ids } = await openCoursePage<'membershipId'>(params, 'change-roster');
  const person = await pageOf(() => rosterPerson(course.id, ids.membershipId));
  const sections = await sectionsOf(course.id);
  const fields = { courseId: course.id, membershipId: person.membershipId };
  const change = { userId: person.userId, from: person.role };
  const leaving = canChangeMembership(actor, course, { ...change, to: null });
  const roles = courseRoles.filter((to) => canChangeMembership(actor, course, { ...change, to }).allowed);
  return (
    <>
      <CourseHead
        actor={actor}
        course={course}
        here="roster"
        steps={[{ label: 'Roster', href: paths.roster(course.id) }]}
        place={person.name}
      />
      <ScriptPage>
        <Section margin={<MarginNote>A change counts from the person’s next click on.</MarginNote>}>
          <PageTitle kicker={`${person.email} · ${roleName(person.role)}`}>{person.name}</PageTitle>
          {leaving.allowed ? (
            <PlaceForm
              {...fields}
              roles={roles}
              sections={sections}
              role={person.role}
              sectionIds={person.sections.map((section) => section.id)}
            />
          ) : (
            <Notice>{leaving.why}</Notice>
          )}
        </Section>
        {leaving.allowed && !person.hasPassword ? (
          <Section label="Invitation" margin={<MarginNote>The link of the earlier mail stops working.</MarginNote>}>
            <h2 className="mb-3">Invitation</h2>
            <ActionButton
              action={inviteAgain}
              fields={fields}
              label="Mail it again"
              done="An invitation is on its way."
            />
          </Section>
        ) : null}
        {leaving.allowed ? (
          <Section
            label="Leaving"
            margin={<MarginNote>Answers, rulings and credit stay, and are theirs again if they come back.</MarginNote>}
          >
            <h2 className="mb-3">Leaving</h2>
            <ActionButton
              action={letLeave}
              fields={fields}
              label="Let them leave"
              look="danger"
              done="Left the course."
              confirm={{
                title: `${person.name} leaves ${course.code}`,
                words: 'They lose sight of the course at once. Nothing they did is deleted.',
              }}
            />
          </Section>
        ) : null}
      </ScriptPage>
    </>
  );
}
