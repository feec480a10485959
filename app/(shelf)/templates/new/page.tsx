import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { pageOf } from '@/app/_server/page';
import { MarginNote, PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { HalfmarkError } from '@/lib/errors';
import { paths } from '@/lib/paths';
import { writableDepartments } from '@/lib/policies/can-use-shelf';
import { departmentsOf } from '@/lib/queries/departments-of';
import { NewTemplateForm } from './_components/new-template-form';

export const metadata = { title: 'New question' };

/** Where a question begins: its title and whose shelf it stands on. */
export default async function NewTemplatePage() {
  const actor = await requireActor();
  const departments = await pageOf(async () => {
    const writable = writableDepartments(actor, await departmentsOf(actor));
    if (writable.length === 0) throw new HalfmarkError('forbidden', 'Only instructors put questions on a shelf.');
    return writable;
  });
  return (
    <>
      <SiteHead
        actor={actor}
        here="templates"
        steps={[{ label: 'Templates', href: paths.templates() }]}
        place="New question"
      />
      <ScriptPage>
        <Section margin={<MarginNote>The draft is seen by the staff of the department only.</MarginNote>}>
          <PageTitle>New question</PageTitle>
          <NewTemplateForm departments={departments.map(({ id, name }) => ({ value: id, label: name }))} />
        </Section>
      </ScriptPage>
    </>
  );
}
