import { SiteHead } from '@/app/_components/page-head';
import { requireActor } from '@/app/_server/current-actor';
import { idsOf, pageOf } from '@/app/_server/page';
import { PageTitle, ScriptPage, Section } from '@/components/ui/script-page';
import { sentenceOf, slipIds } from '@/lib/checker';
import { paths } from '@/lib/paths';
import { templateForEditor } from '@/lib/queries/template-for-editor';
import { type TemplateDraft } from '@/lib/templates/draft';
import { renderPreview, type RenderedPreview } from './_components/render-preview';
import { TemplateEditor } from './_components/template-editor';
import { Versions } from './_components/versions';

export const metadata = { title: 'Template' };

type Props = { params: Promise<{ templateId: string }> };

/** The template editor: source at the left, the live result at the right, versions below. */
export default async function TemplatePage({ params }: Props) {
  const actor = await requireActor();
  const { templateId } = await idsOf(params);
  const template = await pageOf(() => templateForEditor(actor, templateId));
  const latest = template.versions[0];
  return (
    <>
      <SiteHead
        actor={actor}
        here="templates"
        steps={[{ label: 'Templates', href: paths.templates() }]}
        place={template.name}
        status={latest ? `version ${latest.number} is published` : 'not published yet'}
      />
      <ScriptPage margin="none">
        <Section>
          <PageTitle kicker={template.department}>{template.name}</PageTitle>
          <TemplateEditor
            templateId={template.id}
            revision={template.revision}
            draft={template.draft}
            topics={template.topics}
            mayWrite={template.mayWrite}
            nextNumber={(latest?.number ?? 0) + 1}
            preview={previewLater(template.draft)}
            slips={slipIds.map((id) => ({ id, sentence: sentenceOf(id) }))}
          />
        </Section>
        <Section label="Versions">
          <Versions versions={template.versions} />
        </Section>
      </ScriptPage>
    </>
  );
}

/** The time in which the rest of the page is written and sent, in milliseconds; the preview would hold it up. */
const HEAD_START = 50;

/** The preview, worked out when the rest of the page has been sent. */
async function previewLater(draft: TemplateDraft): Promise<RenderedPreview> {
  await new Promise((resolve) => setTimeout(resolve, HEAD_START));
  return renderPreview(draft);
}
