'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';

/** Gives react-query to the part of a page that polls; it is not global, so that other pages do not load it. */
export function QueryProvider({ children }: { children: ReactNode }) {
  const [client] = useState(
    () => new QueryClient({ defaultOptions: { queries: { refetchOnWindowFocus: false, retry: 2, staleTime: 1000 } } }),
  );
  return <QueryClientProvider client={client}>{children}</QueryClientProvider>;
}
