import Link from 'next/link';

export interface PagerProps {
  /** From 1. */
  readonly page: number;
  readonly pageCount: number;
  /** The address of a page. */
  readonly hrefFor: (page: number) => string;
  /** What is paged: "answers". */
  readonly label: string;
}

/** Leads from page to page of a long list; nothing when there is only one. */
export function Pager({ page, pageCount, hrefFor, label }: PagerProps) {
  if (pageCount <= 1) return null;
  return (
    <nav aria-label={`Pages of ${label}`} className="no-print mt-3 flex flex-wrap gap-x-6 text-small">
      {page > 1 ? (
        <Link href={hrefFor(page - 1)} rel="prev">
          earlier
        </Link>
      ) : (
        <span className="text-grey">earlier</span>
      )}
      <span aria-current="page">
        page {page} of {pageCount}
      </span>
      {page < pageCount ? (
        <Link href={hrefFor(page + 1)} rel="next">
          later
        </Link>
      ) : (
        <span className="text-grey">later</span>
      )}
    </nav>
  );
}
