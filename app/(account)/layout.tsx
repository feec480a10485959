import { type ReactNode } from 'react';
import { requireActor } from '@/app/_server/current-actor';

/** Nobody who is signed out gets as far as a page's first byte; each page still decides for itself. */
export default async function AccountLayout({ children }: { children: ReactNode }) {
  await requireActor();
  return children;
}
