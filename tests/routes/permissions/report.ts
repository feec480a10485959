import { paths } from '@/lib/paths';
import { openAppeal } from '@/lib/services/open-appeal';
import { buildAnswer } from '../../factories/answers';
import { type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const report = '(student)/work/[setId]/report';

/** An answer of the scene's student, to part c, which no other row hands in. */
export async function prepare(scene: Scene): Promise<void> {
  const draw = scene.draws.find(({ userId }) => userId === scene.student.user.id);
  if (draw === undefined) throw new Error('The student has a draw.');
  scene.extras['appealableAnswer'] = (await buildAnswer(draw, { partKey: 'c', text: '0' })).id;
}

/** A student's own score report, and appealing a part of it. Whose answer it is is told to nobody else. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: `${report}/page.tsx`,
    path: (scene) => paths.workReport(scene.problemSet.id),
    expect: ['sign-in', 'allow', 'refuse', 'refuse', 'refuse', 'refuse', 'hide'],
  },
  {
    kind: 'action',
    file: `${report}/actions.ts`,
    action: 'appealPart',
    services: ['openAppeal'],
    run: (context, scene) =>
      openAppeal(context, {
        answerId: scene.extras['appealableAnswer'] ?? '',
        reason: 'It is the same operator.',
      }),
    expect: ['sign-in', 'allow', 'hide', 'hide', 'hide', 'hide', 'hide'],
  },
];
