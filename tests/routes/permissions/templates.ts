import { paths } from '@/lib/paths';
import { createTemplate } from '@/lib/services/create-template';
import { publishTemplateVersion } from '@/lib/services/publish-template-version';
import { saveTemplateDraft } from '@/lib/services/save-template-draft';
import { emptyDraft } from '@/lib/templates/blank-draft';
import { type Expectation, type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const shelf = '(shelf)/templates';

/** Instructors of the department and administrators write; to a student, and to another department, it is not there. */
const writers: Expectation = ['sign-in', 'hide', 'refuse', 'refuse', 'allow', 'allow', 'hide'];

const ofTemplate = (scene: Scene) => ({ templateId: scene.template.id, revision: scene.template.draftRevision });

/** The department's shelf of templates. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: `${shelf}/page.tsx`,
    path: paths.templates,
    expect: ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'page',
    file: `${shelf}/new/page.tsx`,
    path: paths.newTemplate,
    expect: ['sign-in', 'refuse', 'refuse', 'refuse', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'action',
    file: `${shelf}/new/actions.ts`,
    action: 'makeTemplate',
    services: ['createTemplate'],
    run: (context, scene) =>
      createTemplate(context, { departmentId: scene.course.departmentId, name: 'A new question' }),
    expect: ['sign-in', 'refuse', 'refuse', 'refuse', 'allow', 'allow', 'refuse'],
  },
  {
    kind: 'page',
    file: `${shelf}/[templateId]/page.tsx`,
    path: (scene) => paths.template(scene.template.id),
    // A student of a course that uses it is told that it is closed to them, not that it is not there.
    expect: ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'allow', 'hide'],
  },
  {
    kind: 'action',
    file: `${shelf}/[templateId]/actions.ts`,
    action: 'saveDraft',
    services: ['saveTemplateDraft'],
    run: (context, scene) => saveTemplateDraft(context, { ...ofTemplate(scene), draft: emptyDraft('A question') }),
    expect: writers,
  },
  {
    kind: 'action',
    file: `${shelf}/[templateId]/actions.ts`,
    action: 'publishDraft',
    services: ['publishTemplateVersion'],
    run: (context, scene) => publishTemplateVersion(context, ofTemplate(scene)),
    expect: writers,
  },
];
