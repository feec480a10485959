import Link from 'next/link';
import { paths } from '@/lib/paths';
import { type ToSettle } from '@/lib/presenters/consistency';

type Props = { courseId: string; setId: string; items: readonly ToSettle[] };

/** The answers whose two markings lie further apart than the set tolerates, each leading to where it is settled. */
export function SettleList({ courseId, setId, items }: Props) {
  if (items.length === 0) return <p className="text-grey">No two markings wait to be settled.</p>;
  return (
    <ul className="grid gap-1">
      {items.map(({ secondMarkingId, where, credits }) => (
        <li key={secondMarkingId} className="flex flex-wrap gap-x-4">
          <Link href={paths.settle(courseId, setId, secondMarkingId)}>{where}</Link>
          <span className="text-grey">{credits}</span>
        </li>
      ))}
    </ul>
  );
}
