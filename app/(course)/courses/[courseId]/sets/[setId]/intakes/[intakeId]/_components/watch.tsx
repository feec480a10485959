'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import { z } from 'zod';
import { Progress } from '@/components/ui/progress';

const progress = z.object({ state: z.string(), rowsAccepted: z.number(), rowsChecked: z.number() });

interface WatchProps {
  readonly intakeId: string;
  readonly state: string;
  readonly total: number;
  readonly done: number;
}

const count = new Intl.NumberFormat('en-GB');

/** How far the worker is with an upload; the page is loaded anew when it passes on to the next stage. */
export function Watch({ intakeId, state, total, done }: WatchProps) {
  const router = useRouter();
  const { data, isError } = useQuery({
    queryKey: ['intake', intakeId],
    queryFn: async () => {
      const response = await fetch(`/api/intakes/${intakeId}`);
      if (!response.ok) throw new Error(String(response.status));
      return progress.parse(await response.json());
    },
    refetchInterval: 700,
  });
  const now = data ?? { state, rowsAccepted: total, rowsChecked: done };
  const changed = data !== undefined && data.state !== state;
  useEffect(() => {
    if (changed) router.refresh();
  }, [changed, router]);
  if (isError) return <p className="text-small text-grey">Halfmark cannot be reached; the work goes on meanwhile.</p>;
  if (now.state === 'uploaded' || now.state === 'reading') return <Progress label="Reading the sheet" />;
  return (
    <Progress
      label={now.state === 'committing' ? 'Taking in and checking' : 'Checking'}
      value={now.rowsChecked}
      max={Math.max(1, now.rowsAccepted)}
      detail={`${count.format(now.rowsChecked)} of ${count.format(now.rowsAccepted)} answers checked`}
    />
  );
}
