import { redirect } from 'next/navigation';
import { requireActor } from '@/app/_server/current-actor';
import { isStaffRole } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';

/** The front door: leads each person to where their work is. */
export default async function FrontDoor() {
  const actor = await requireActor();
  const roles = [...actor.memberships.values()].map((membership) => membership.role);
  if (roles.some(isStaffRole)) redirect(paths.courses());
  if (roles.length === 0 && actor.isAdministrator) redirect(paths.adminCourses());
  redirect(paths.work());
}
