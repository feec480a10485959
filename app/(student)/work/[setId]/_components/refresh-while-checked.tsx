'use client';

import { useRouter } from 'next/navigation';
import { useEffect } from 'react';

/** Between two looks for a verdict, in milliseconds; the checker itself takes far less. */
const pause = 1_500;

/** Loads the page's figures anew while an answer waits for its verdict; it stands on the page only as long. */
export function RefreshWhileChecked() {
  const router = useRouter();
  useEffect(() => {
    const timer = setInterval(() => {
      if (document.visibilityState === 'visible') router.refresh();
    }, pause);
    return () => clearInterval(timer);
  }, [router]);
  return null;
}
