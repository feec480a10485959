import { Delivery } from '@/models/delivery';
import { ScoreReport } from '@/models/score-report';
import { paths } from '@/lib/paths';
import { messageIdOf } from '@/lib/services/message-id';
import { releaseScores } from '@/lib/services/release-scores';
import { retryDelivery } from '@/lib/services/retry-delivery';
import { type Expectation, type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const set = '(course)/courses/[courseId]/sets/[setId]';

/** Release and what became of it are the head TA's and the instructor's. */
const releasers: Expectation = ['sign-in', 'refuse', 'refuse', 'allow', 'allow', 'refuse', 'hide'];

const at = (scene: Scene) => [scene.course.id, scene.problemSet.id] as const;

/** A student of the scene other than the one whose report is tried as released. */
const unreleased = (scene: Scene): string => scene.students[1]?.user.id ?? '';

/** A report with a failed delivery, of a student whose scores are not recorded as out. */
export async function prepare(scene: Scene): Promise<void> {
  const report = await ScoreReport.create({
    problemSetId: scene.problemSet.id,
    userId: unreleased(scene),
    revision: 1,
    content: {},
    reason: 'Your scores are released.',
  });
  const delivery = await Delivery.create({
    scoreReportId: report.id,
    state: 'failed',
    messageId: messageIdOf(report.id),
    lastError: 'the mail server answered 550',
    sendingAt: null,
    sentAt: null,
  });
  scene.extras['failedDelivery'] = delivery.id;
}

/** Releasing a set, its deliveries, and any student's report beforehand. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: `${set}/release/page.tsx`,
    path: (scene) => paths.release(...at(scene)),
    expect: releasers,
  },
  {
    kind: 'action',
    file: `${set}/release/actions.ts`,
    action: 'releaseNow',
    services: ['releaseScores'],
    run: (context, scene) => releaseScores(context, { problemSetId: scene.problemSet.id, reportWaitingParts: false }),
    expect: releasers,
  },
  {
    kind: 'page',
    file: `${set}/deliveries/page.tsx`,
    path: (scene) => paths.deliveries(...at(scene)),
    expect: releasers,
  },
  {
    kind: 'action',
    file: `${set}/deliveries/actions.ts`,
    action: 'sendAgain',
    services: ['retryDelivery'],
    run: (context, scene) => retryDelivery(context, { deliveryId: scene.extras['failedDelivery'] ?? '' }),
    expect: releasers,
  },
  {
    kind: 'route',
    file: 'api/problem-sets/[setId]/deliveries/route.ts',
    method: 'GET',
    path: (scene) => paths.deliveriesApi(scene.problemSet.id),
    expect: releasers,
  },
  {
    kind: 'page',
    file: `${set}/reports/[userId]/page.tsx`,
    path: (scene) => paths.reportOf(...at(scene), unreleased(scene)),
    expect: releasers,
  },
];
