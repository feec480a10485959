import { RunningHead, type RunningHeadProps } from '@/components/ui/running-head';
import { type PersonActor } from '@/lib/domain/actor';
import { AccountLine } from './account-line';

/** The running head of a page for signed-in people: the head itself, and who is signed in. */
export function PageHead({ actor, ...head }: Omit<RunningHeadProps, 'account'> & { actor: PersonActor }) {
  return <RunningHead {...head} account={<AccountLine name={actor.name} />} />;
}
