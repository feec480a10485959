import { type ReactNode } from 'react';
import { courseOfPage } from '@/app/_server/course-page';
import { idsOf } from '@/app/_server/page';

type Props = { children: ReactNode; params: Promise<{ courseId: string }> };

/** A course that is not there for this person is answered before anything of its pages is sent. */
export default async function OneCourseLayout({ children, params }: Props) {
  const { courseId } = await idsOf(params);
  await courseOfPage(courseId);
  return children;
}
