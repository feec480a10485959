import Link from 'next/link';
import { LinkPending } from './link-pending';

export interface NavItem {
  readonly label: string;
  readonly href: string;
  readonly current?: boolean;
  /** A count behind the word, e.g. how many answers wait. */
  readonly count?: number;
}

/** Ways to go, as a line of words; the present one is underscored with the madder stroke. Also serves as tabs by link. */
export function NavLine({ items, label }: { items: readonly NavItem[]; label: string }) {
  if (items.length === 0) return null;
  return (
    <nav aria-label={label}>
      <ul className="-mx-1 flex flex-wrap gap-x-4">
        {items.map((item) => (
          <li key={item.href}>
            <Link
              href={item.href}
              aria-current={item.current ? 'page' : undefined}
              className="inline-block border-b-2 border-transparent px-1 py-0.5 text-grey no-underline hover:border-hairline hover:text-ink aria-[current=page]:border-madder aria-[current=page]:text-ink"
            >
              {item.label}
              {item.count === undefined ? null : <span className="ms-1.5 text-note text-grey">{item.count}</span>}
              <LinkPending />
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
