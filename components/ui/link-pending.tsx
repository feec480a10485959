'use client';

import { useLinkStatus } from 'next/link';

/** Three dots behind a link while the page it leads to is on its way. Must stand inside a `<Link>`. */
export function LinkPending() {
  const { pending } = useLinkStatus();
  return pending ? (
    <span aria-hidden="true" className="ms-0.5">
      …
    </span>
  ) : null;
}
