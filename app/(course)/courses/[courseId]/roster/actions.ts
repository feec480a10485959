'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { type ActionResult } from '@/app/_server/action-result';
import { runAction } from '@/app/_server/run-action';
import { paths } from '@/lib/paths';
import { changeMembership, changeMembershipSchema } from '@/lib/services/change-membership';
import { createSection, createSectionSchema } from '@/lib/services/create-section';
import { endMembership, endMembershipSchema } from '@/lib/services/end-membership';
import { inviteToCourse, inviteToCourseSchema } from '@/lib/services/invite-to-course';
import { resendInvitation } from '@/lib/services/resend-invitation';

/** Brings a person into the course, by invitation where they have no account yet. */
export async function invitePerson(form: FormData): Promise<ActionResult<{ invited: boolean }>> {
  return refreshed(await runAction(inviteToCourseSchema, form, inviteToCourse));
}

/** Makes a section of the course. */
export async function addSection(form: FormData): Promise<ActionResult<unknown>> {
  return refreshed(await runAction(createSectionSchema, form, createSection));
}

/** Changes a person's role and sections, and goes back to the roster. */
export async function savePlace(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(changeMembershipSchema, form, changeMembership);
  return result.ok ? backToRoster(form) : result;
}

/** Lets a person leave the course, and goes back to the roster. */
export async function letLeave(form: FormData): Promise<ActionResult<void>> {
  const result = await runAction(endMembershipSchema, form, endMembership);
  return result.ok ? backToRoster(form) : result;
}

/** Mails a new invitation. */
export async function inviteAgain(form: FormData): Promise<ActionResult<void>> {
  return runAction(endMembershipSchema, form, resendInvitation);
}

function refreshed<Value>(result: ActionResult<Value>): ActionResult<Value> {
  if (result.ok) revalidatePath('/courses/[courseId]/roster', 'page');
  return result;
}

function backToRoster(form: FormData): never {
  const courseId = form.get('courseId');
  redirect(paths.roster(typeof courseId === 'string' ? courseId : ''));
}
