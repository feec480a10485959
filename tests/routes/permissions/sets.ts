import { defaultSetPolicy } from '@/lib/domain/set-policy';
import { paths } from '@/lib/paths';
import { closeProblemSet } from '@/lib/services/close-problem-set';
import { createProblemSet } from '@/lib/services/create-problem-set';
import { editProblemSet } from '@/lib/services/edit-problem-set';
import { addItem, orderItems, removeItem, setItemPoints } from '@/lib/services/edit-set-items';
import { openProblemSet } from '@/lib/services/open-problem-set';
import { reopenProblemSet } from '@/lib/services/reopen-problem-set';
import { type ActionRow, type Expectation, type Row } from '../matrix/row';
import { type Scene } from '../matrix/scene';

const sets = '(course)/courses/[courseId]/sets';

/** Problem sets are the instructor's alone; an administrator, too, only stands beside the course. */
const instructorOnly: Expectation = ['sign-in', 'refuse', 'refuse', 'refuse', 'allow', 'refuse', 'hide'];

const ofSet = (scene: Scene) => ({ problemSetId: scene.problemSet.id, revision: scene.problemSet.revision });

function change(action: string, services: readonly string[], run: ActionRow['run']): ActionRow {
  return { kind: 'action', file: `${sets}/[setId]/actions.ts`, action, services, run, expect: instructorOnly };
}

/** A course's sets. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: '(course)/courses/[courseId]/page.tsx',
    path: (scene) => paths.course(scene.course.id),
    expect: ['sign-in', 'elsewhere', 'allow', 'allow', 'allow', 'refuse', 'hide'],
  },
  {
    kind: 'page',
    file: `${sets}/new/page.tsx`,
    path: (scene) => paths.newSet(scene.course.id),
    expect: instructorOnly,
  },
  {
    kind: 'action',
    file: `${sets}/new/actions.ts`,
    action: 'makeSet',
    services: ['createProblemSet'],
    run: (context, scene) => createProblemSet(context, { courseId: scene.course.id, title: 'Spin in a field' }),
    expect: instructorOnly,
  },
  {
    kind: 'page',
    file: `${sets}/[setId]/page.tsx`,
    path: (scene) => paths.set(scene.course.id, scene.problemSet.id),
    expect: ['sign-in', 'elsewhere', 'allow', 'allow', 'allow', 'refuse', 'hide'],
  },
  change('openSet', ['openProblemSet'], (context, scene) => openProblemSet(context, ofSet(scene))),
  change('closeSetNow', ['closeProblemSet'], (context, scene) => closeProblemSet(context, ofSet(scene))),
  change('reopenSet', ['reopenProblemSet'], (context, scene) =>
    reopenProblemSet(context, { ...ofSet(scene), closesAt: new Date(Date.now() + 1_000_000) }),
  ),
  change('savePlan', ['editProblemSet'], (context, scene) =>
    editProblemSet(context, {
      ...ofSet(scene),
      title: 'Spin in a field',
      opensAt: scene.problemSet.opensAt,
      closesAt: scene.problemSet.closesAt,
      appealsUntil: scene.problemSet.appealsUntil,
      attemptsAllowed: 3,
      policy: defaultSetPolicy,
    }),
  ),
  change('addQuestion', ['addItem'], (context, scene) =>
    addItem(context, { ...ofSet(scene), templateVersionId: scene.templateVersion.id, points: 1000 }),
  ),
  change('changePoints', ['setItemPoints'], (context, scene) =>
    setItemPoints(context, { ...ofSet(scene), itemId: scene.item.id, points: 1000 }),
  ),
  change('removeQuestion', ['removeItem'], (context, scene) =>
    removeItem(context, { ...ofSet(scene), itemId: scene.item.id }),
  ),
  change('orderQuestions', ['orderItems'], (context, scene) =>
    orderItems(context, { ...ofSet(scene), itemIds: [scene.item.id] }),
  ),
];
