'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { createCourse, createCourseSchema } from '@/lib/services/create-course';
import { editCourse, editCourseSchema } from '@/lib/services/edit-course';

/** Makes a course and leads to its roster, since it needs an instructor next. */
export async function makeCourse(form: FormData): Promise<ActionResult<{ courseId: string }>> {
  const result = await runAction(createCourseSchema, form, createCourse);
  if (result.ok) redirect(paths.roster(result.value.courseId));
  return result;
}

/** Changes what a course is called and how it runs. */
export async function saveCourse(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(editCourseSchema, form, editCourse);
  if (result.ok) revalidatePath('/admin/courses', 'layout');
  return result;
}
