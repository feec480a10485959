'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import { z } from 'zod';

const answer = z.object({ stamp: z.string() });

/** Loads the queue anew when somebody changed it: looked at every ten seconds while the page is in sight. */
export function QueuePulse({ problemSetId, stamp }: { problemSetId: string; stamp: string }) {
  const router = useRouter();
  const { data, isError } = useQuery({
    queryKey: ['queue', problemSetId],
    queryFn: async () => {
      const response = await fetch(`/api/queue-stamp/${problemSetId}`);
      if (!response.ok) throw new Error(String(response.status));
      return answer.parse(await response.json());
    },
    refetchInterval: 10_000,
  });
  const changed = data !== undefined && data.stamp !== stamp;
  useEffect(() => {
    if (changed) router.refresh();
  }, [changed, router]);
  return (
    <p role="status" className="text-note text-grey">
      {isError ? 'Halfmark cannot be reached; this list may be out of date.' : 'Kept current.'}
    </p>
  );
}
