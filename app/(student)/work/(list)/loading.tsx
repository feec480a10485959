import { RunningHead } from '@/components/ui/running-head';
import { PageSkeleton } from '@/components/ui/skeleton';

/** While a student's sets or questions are on their way. */
export default function Loading() {
  return (
    <>
      <RunningHead place="My work" />
      <PageSkeleton />
    </>
  );
}
