import { loadActor } from '@/lib/auth/load-actor';
import { inTransaction } from '@/lib/db/transaction';
import { type Actor } from '@/lib/domain/actor';
import { type ServiceContext } from '@/lib/services/context';
import { type User } from '@/models/user';

/** Runs a service as a person would: in a transaction, with their roles as they are, at `now`. */
export function actingAs<Result>(
  user: User,
  work: (context: ServiceContext) => Promise<Result>,
  now: Date = new Date(),
): Promise<Result> {
  return inTransaction(async (transaction) => {
    const actor = await loadActor(user.id, transaction);
    if (actor === null) throw new Error('This person is deactivated and cannot act.');
    return work({ actor, transaction, now });
  });
}

/** Runs a service as a job would. */
export function actingAsSystem<Result>(
  work: (context: ServiceContext) => Promise<Result>,
  now: Date = new Date(),
): Promise<Result> {
  const actor: Actor = { kind: 'system', name: 'test' };
  return inTransaction((transaction) => work({ actor, transaction, now }));
}
