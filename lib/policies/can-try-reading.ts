import { type Actor } from '@/lib/domain/actor';
import { grantOf } from '@/lib/domain/permissions';
import { type Decision } from './decide';

/** Whoever may try how mathematics is read in one course, or by office, may open the page for it. */
export function canTryReading(actor: Actor): Decision {
  const offices =
    actor.kind === 'user'
      ? [
          ...[...actor.memberships.values()].map(({ role }) => role),
          ...(actor.isAdministrator ? (['administrator'] as const) : []),
        ]
      : [];
  return offices.some((office) => grantOf(office, 'try-reading') !== null)
    ? { allowed: true, grant: 'yes' }
    : { allowed: false, why: 'This page is for people who are in a course.' };
}
