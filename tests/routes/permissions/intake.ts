import { cancelIntake, commitIntake } from '@/lib/services/commit-intake';
import { paths } from '@/lib/paths';
import { buildIntake, buildIntakeRow } from '../../factories/intakes';
import { type Expectation, type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const set = '(course)/courses/[courseId]/sets/[setId]';

/** Answers are taken in by graders. */
const graders: Expectation = ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'refuse', 'hide'];

const at = (scene: Scene) => [scene.course.id, scene.problemSet.id] as const;
const intakeId = (scene: Scene): string => scene.extras['intake'] ?? '';

/** A previewed upload with one good row. */
export async function prepare(scene: Scene): Promise<void> {
  const intake = await buildIntake(scene.problemSet, scene.ta.user, {
    state: 'previewed',
    rowsTotal: 1,
    rowsAccepted: 1,
  });
  await buildIntakeRow(intake, {
    state: 'accepted',
    userId: scene.student.user.id,
    itemId: scene.item.id,
    partKey: 'c',
    text: '0',
  });
  scene.extras['intake'] = intake.id;
}

/** Bulk intake: the pages, the upload, its progress and sheets. */
export const rows: readonly Row[] = [
  { kind: 'page', file: `${set}/intake/page.tsx`, path: (scene) => paths.intakes(...at(scene)), expect: graders },
  {
    kind: 'page',
    file: `${set}/intakes/[intakeId]/page.tsx`,
    path: (scene) => paths.intake(...at(scene), intakeId(scene)),
    expect: graders,
  },
  {
    kind: 'route',
    file: 'api/intakes/route.ts',
    method: 'POST',
    path: (scene) => `/api/intakes?set=${scene.problemSet.id}`,
    body: () => 'student,question,part,answer',
    expect: graders,
  },
  {
    kind: 'route',
    file: 'api/intakes/[intakeId]/route.ts',
    method: 'GET',
    path: (scene) => `/api/intakes/${intakeId(scene)}`,
    expect: graders,
  },
  {
    kind: 'route',
    file: 'api/intakes/[intakeId]/outcome/route.ts',
    method: 'GET',
    path: (scene) => `/api/intakes/${intakeId(scene)}/outcome`,
    expect: graders,
  },
  {
    kind: 'route',
    file: 'api/intakes/blank/route.ts',
    method: 'GET',
    path: (scene) => `/api/intakes/blank?set=${scene.problemSet.id}`,
    expect: graders,
  },
  {
    kind: 'action',
    file: `${set}/intake/actions.ts`,
    action: 'takeIn',
    services: ['commitIntake'],
    run: (context, scene) => commitIntake(context, { intakeId: intakeId(scene), goodRowsOnly: true }),
    expect: graders,
  },
  {
    kind: 'action',
    file: `${set}/intake/actions.ts`,
    action: 'giveUp',
    services: ['cancelIntake'],
    run: (context, scene) => cancelIntake(context, { intakeId: intakeId(scene) }),
    expect: graders,
  },
];
