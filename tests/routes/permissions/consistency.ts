import { paths } from '@/lib/paths';
import { type Row } from '../matrix/row';

/** How alike a set was marked: for its staff, a TA's own figures only (tests/queries/consistency-of-set.test.ts). */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: '(course)/courses/[courseId]/sets/[setId]/consistency/page.tsx',
    path: (scene) => paths.consistency(scene.course.id, scene.problemSet.id),
    expect: ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'refuse', 'hide'],
  },
];
