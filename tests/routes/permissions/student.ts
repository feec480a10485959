import { paths } from '@/lib/paths';
import { handInAnswers } from '@/lib/services/hand-in-answers';
import { saveAnswer } from '@/lib/services/save-answer';
import { type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const set = '(student)/work/[setId]';

/** The draw of the scene's student. */
const drawOf = (scene: Scene): string => scene.draws.find((draw) => draw.userId === scene.student.user.id)?.id ?? '';

const draft = (scene: Scene) => ({ drawId: drawOf(scene), partKey: 'a', text: 'S_x', baseRevision: 0 });

const handedIn = (scene: Scene) => ({
  drawId: drawOf(scene),
  answers: [{ partKey: 'a', text: 'i hbar S_z' }],
  clientKey: '6f1f3c7e-5a0e-4a3e-9b55-0f4d8a2f7c11',
  confirmUnreadable: false,
});

/** A student's own work, and trying a reading. Whose draw it is is told to nobody else. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: '(student)/work/(list)/page.tsx',
    path: paths.work,
    expect: ['sign-in', 'allow', 'elsewhere', 'elsewhere', 'elsewhere', 'allow', 'elsewhere'],
  },
  {
    kind: 'page',
    file: `${set}/page.tsx`,
    path: (scene) => paths.workSet(scene.problemSet.id),
    expect: ['sign-in', 'allow', 'refuse', 'refuse', 'refuse', 'refuse', 'hide'],
  },
  {
    kind: 'action',
    file: `${set}/actions.ts`,
    action: 'handIn',
    services: ['handInAnswers'],
    run: (context, scene) => handInAnswers(context, handedIn(scene)),
    expect: ['sign-in', 'allow', 'hide', 'hide', 'hide', 'hide', 'hide'],
  },
  {
    kind: 'action',
    file: `${set}/actions.ts`,
    action: 'handInForm',
    services: ['saveAnswer', 'handInAnswers'],
    run: async (context, scene) => {
      await saveAnswer(context, draft(scene));
      await handInAnswers(context, handedIn(scene));
    },
    expect: ['sign-in', 'allow', 'hide', 'hide', 'hide', 'hide', 'hide'],
  },
  {
    kind: 'route',
    file: 'api/saved-answers/route.ts',
    method: 'PUT',
    path: () => '/api/saved-answers',
    body: draft,
    expect: ['sign-in', 'allow', 'hide', 'hide', 'hide', 'hide', 'hide'],
  },
  {
    kind: 'page',
    file: '(tools)/reading/page.tsx',
    path: paths.reading,
    expect: ['sign-in', 'allow', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
];
