import { paths } from '@/lib/paths';
import { answerAppeal } from '@/lib/services/answer-appeal';
import { markSecond } from '@/lib/services/mark-second';
import { escalateQueueItem, releaseQueueItem, renewHold } from '@/lib/services/release-queue-item';
import { ruleOnAnswer } from '@/lib/services/rule-on-answer';
import { settleDisagreement } from '@/lib/services/settle-disagreement';
import { takeNextItem } from '@/lib/services/take-next-item';
import { takeQueueItem } from '@/lib/services/take-queue-item';
import { type ServiceContext } from '@/lib/services/context';
import { buildAnswer } from '../../factories/answers';
import { buildQueueItem, buildRuling, buildSecondMarking } from '../../factories/marking';
import { type ActionRow, type Expectation, type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const set = '(course)/courses/[courseId]/sets/[setId]';
const actions = `${set}/desk/actions.ts`;

/** The queue is worked by graders, whatever their office. */
const graders: Expectation = ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'refuse', 'hide'];
/** Disagreements are settled by the head TA and the instructor. */
const settlers: Expectation = ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'refuse', 'hide'];
/** A second marking is its grader's alone; other graders are not told that it exists. */
const assigned: Expectation = ['sign-in', 'refuse', 'allow', 'hide', 'hide', 'refuse', 'hide'];

const at = (scene: Scene) => [scene.course.id, scene.problemSet.id] as const;
const extra = (scene: Scene, name: string): string => scene.extras[name] ?? '';
const waiting = (scene: Scene) => ({ queueItemId: extra(scene, 'waitingItem') });
const mark = { credit: 0, comment: 'No.', millisecondsSpent: null };

/** One answer that waits, one assigned to the scene's TA for second marking, one on which two graders differ. */
export async function prepare(scene: Scene): Promise<void> {
  const other = scene.tas[1];
  if (!other) throw new Error('The scene has two TAs.');
  const itemOf = async (index: number) => {
    const draw = scene.draws[index];
    if (!draw) throw new Error('The scene has four draws.');
    return buildQueueItem(await buildAnswer(draw, { partKey: 'b', text: '-i hbar S_z' }));
  };
  scene.extras['waitingItem'] = (await itemOf(1)).id;
  const assignedTo = await buildSecondMarking(await buildRuling(await itemOf(2), other.user), scene.ta.user);
  scene.extras['secondMarking'] = assignedTo.id;
  const disputed = await itemOf(3);
  const ruling = await buildRuling(disputed, other.user);
  await disputed.update({ state: 'to-settle' });
  const differing = await buildSecondMarking(ruling, scene.ta.user, {
    state: 'to-settle',
    credit: 0,
    markedAt: new Date(),
  });
  scene.extras['disagreement'] = differing.id;
}

/** An action on the waiting item by who has just taken it. */
function onHeld(
  action: string,
  services: readonly string[],
  run: (context: ServiceContext, scene: Scene) => Promise<unknown>,
): ActionRow {
  return {
    kind: 'action',
    file: actions,
    action,
    services: ['takeQueueItem', ...services],
    run: async (context, scene) => {
      await takeQueueItem(context, waiting(scene));
      return run(context, scene);
    },
    expect: graders,
  };
}

/** The queue, the desk, second marking and settling. */
export const rows: readonly Row[] = [
  { kind: 'page', file: `${set}/queue/page.tsx`, path: (scene) => paths.queue(...at(scene)), expect: graders },
  {
    kind: 'route',
    file: 'api/queue-stamp/[problemSetId]/route.ts',
    method: 'GET',
    path: (scene) => `/api/queue-stamp/${scene.problemSet.id}`,
    expect: graders,
  },
  {
    kind: 'page',
    file: `${set}/desk/[queueItemId]/page.tsx`,
    path: (scene) => paths.desk(...at(scene), extra(scene, 'waitingItem')),
    expect: graders,
  },
  {
    kind: 'page',
    file: `${set}/desk/second/[secondMarkingId]/page.tsx`,
    path: (scene) => paths.secondMarking(...at(scene), extra(scene, 'secondMarking')),
    expect: assigned,
  },
  {
    kind: 'page',
    file: `${set}/queue/settle/[secondMarkingId]/page.tsx`,
    path: (scene) => paths.settle(...at(scene), extra(scene, 'disagreement')),
    expect: settlers,
  },
  {
    kind: 'action',
    file: actions,
    action: 'takeNext',
    services: ['takeNextItem'],
    run: (context, scene) => takeNextItem(context, { problemSetId: scene.problemSet.id }),
    expect: graders,
  },
  onHeld('takeOne', [], () => Promise.resolve()),
  onHeld('rule', ['ruleOnAnswer', 'answerAppeal', 'takeNextItem'], async (context, scene) => {
    await answerAppeal(context, { ...waiting(scene), credit: 0, reply: 'No.', millisecondsSpent: null }).catch(
      isNoAppeal,
    );
    await ruleOnAnswer(context, { ...waiting(scene), ...mark });
    await takeNextItem(context, { problemSetId: scene.problemSet.id });
  }),
  onHeld('putBack', ['releaseQueueItem'], (context, scene) => releaseQueueItem(context, waiting(scene))),
  onHeld('escalate', ['escalateQueueItem'], (context, scene) =>
    escalateQueueItem(context, { ...waiting(scene), question: 'Is this form allowed?' }),
  ),
  onHeld('keepHold', ['renewHold'], (context, scene) => renewHold(context, waiting(scene))),
  {
    kind: 'action',
    file: actions,
    action: 'giveSecondMark',
    services: ['markSecond'],
    run: (context, scene) => markSecond(context, { secondMarkingId: extra(scene, 'secondMarking'), ...mark }),
    expect: ['sign-in', 'hide', 'allow', 'hide', 'hide', 'hide', 'hide'],
  },
  {
    kind: 'action',
    file: actions,
    action: 'settle',
    services: ['settleDisagreement'],
    run: (context, scene) =>
      settleDisagreement(context, { secondMarkingId: extra(scene, 'disagreement'), credit: 0, comment: 'Settled.' }),
    expect: settlers,
  },
];

/** The scene's waiting answer is no appeal; what matters here is who gets as far as being told so. */
function isNoAppeal(error: unknown): void {
  if (!(error instanceof Error) || !error.message.includes('not an appeal')) throw error;
}
