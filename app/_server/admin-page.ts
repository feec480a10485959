import 'server-only';
import { type PersonActor } from '@/lib/domain/actor';
import { type Ability } from '@/lib/domain/permissions';
import { canAdminister } from '@/lib/policies/can-administer';
import { requireAllowed } from '@/lib/policies/decide';
import { requireActor } from './current-actor';
import { pageOf } from './page';

/** Opens a page of the administration to administrators; others get the page for a refusal. */
export async function openAdminPage(ability: Ability): Promise<PersonActor> {
  const actor = await requireActor();
  return pageOf(() => {
    requireAllowed(canAdminister(actor, ability));
    return Promise.resolve(actor);
  });
}
