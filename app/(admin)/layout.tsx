import { type ReactNode } from 'react';
import { openAdminPage } from '@/app/_server/admin-page';

/** Nobody but an administrator gets as far as a page's first byte; each page still decides for itself. */
export default async function AdminLayout({ children }: { children: ReactNode }) {
  await openAdminPage('manage-accounts');
  return children;
}
