import { PageHead } from '@/app/_components/page-head';
import { adminNav } from '@/app/_components/site-nav';
import { type HeadStep } from '@/components/ui/running-head';
import { type PersonActor } from '@/lib/domain/actor';
import { paths } from '@/lib/paths';

type Props = {
  actor: PersonActor;
  here: Parameters<typeof adminNav>[1];
  place: string;
  steps?: readonly HeadStep[];
};

/** The running head of the administration's pages. */
export function AdminHead({ actor, here, place, steps = [] }: Props) {
  const first = { label: 'Administration', href: paths.adminCourses() };
  return <PageHead actor={actor} steps={[first, ...steps]} place={place} nav={adminNav(actor, here)} />;
}
