import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { pageOf } from '@/app/_server/page';
import { ButtonLink } from '@/components/ui/button';
import { DataTable, type TableRow } from '@/components/ui/data-table';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { paths } from '@/lib/paths';
import { canUseShelf, writableDepartments } from '@/lib/policies/can-use-shelf';
import { requireAllowed } from '@/lib/policies/decide';
import { kindName } from '@/lib/presenters/kind-name';
import { departmentsOf } from '@/lib/queries/departments-of';
import { shelfFor, type ShelfTemplate } from '@/lib/queries/shelf';

export const metadata = { title: 'Templates' };

/** The shelf: every question of the departments a person works for. */
export default async function ShelfPage() {
  const actor = await requireActor();
  const { templates, departments } = await pageOf(async () => {
    requireAllowed(canUseShelf(actor));
    return { templates: await shelfFor(actor), departments: await departmentsOf(actor) };
  });
  const mayWrite = writableDepartments(actor, departments).length > 0;
  const make = mayWrite ? (
    <ButtonLink look="primary" href={paths.newTemplate()}>
      New question
    </ButtonLink>
  ) : null;
  return (
    <>
      <SiteHead actor={actor} here="templates" place="Templates" />
      <ScriptPage>
        <Section
          margin={
            <div className="grid gap-4">
              {templates.length > 0 && make ? <div>{make}</div> : null}
              <MarginNote>
                A template is one question with drawn values: every student gets their own numbers. A published version
                never changes; an edit makes the next one.
              </MarginNote>
            </div>
          }
        >
          <PageTitle kicker={departments.map((department) => department.name).join(', ')}>The shelf</PageTitle>
          {templates.length === 0 ? (
            <EmptyState title="The shelf is empty" action={make}>
              {mayWrite
                ? 'Write the first question: a prompt, what is drawn, and how the right answer is computed.'
                : 'Instructors of the department write its questions; they appear here.'}
            </EmptyState>
          ) : (
            <DataTable caption="Questions" columns={columns} rows={templates.map(rowOf)} filterLabel="Search" />
          )}
        </Section>
      </ScriptPage>
    </>
  );
}

const columns = [
  { key: 'name', label: 'Question', heading: true },
  { key: 'version', label: 'Version', align: 'end' },
  { key: 'kinds', label: 'Asks for' },
  { key: 'topics', label: 'Topics' },
  { key: 'sets', label: 'In sets', align: 'end' },
] as const;

function rowOf(template: ShelfTemplate): TableRow {
  return {
    id: template.id,
    cells: {
      name: { value: template.name, href: paths.template(template.id) },
      version: { value: template.version, text: template.version === null ? 'draft' : String(template.version) },
      kinds: template.kinds.map(kindName).join(', ').toLowerCase(),
      topics: template.topics.join(', '),
      sets: template.sets,
    },
  };
}
