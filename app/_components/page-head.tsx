import { RunningHead, type RunningHeadProps } from '@/components/ui/running-head';
import { type PersonActor } from '@/lib/domain/actor';
import { AccountLine } from './account-line';
import { siteNav, type SitePlace } from './site-nav';

type Props = Omit<RunningHeadProps, 'account'> & { actor: PersonActor };

/** The running head of a page for signed-in people: the head itself, and who is signed in. */
export function PageHead({ actor, ...head }: Props) {
  return <RunningHead {...head} account={<AccountLine name={actor.name} />} />;
}

/** The running head of a page outside any course, with the line of pages open to this person. */
export function SiteHead({ here, ...head }: Omit<Props, 'nav'> & { here: SitePlace }) {
  return <PageHead {...head} nav={siteNav(head.actor, here)} />;
}
