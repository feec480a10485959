import Link from 'next/link';
import { Section } from '@/components/ui/script-page';
import { paths } from '@/lib/paths';
import { type ReleaseOverview } from '@/lib/queries/release-overview';
import { type WaitingPart } from '@/lib/queries/waiting-parts';

/** The parts at which answers still wait, with the way to the queue; nothing when none does. */
export function WhatWaits({ overview: { course, set, waiting } }: { overview: ReleaseOverview }) {
  if (waiting.length === 0) return null;
  return (
    <Section label="What waits" margin={<Link href={paths.queue(course.id, set.id)}>Work the queue</Link>}>
      <h2 className="mb-3">What waits</h2>
      <ul className="grid gap-1">
        {waiting.map((part) => (
          <li key={`${part.position}-${part.partKey}`}>
            Question {part.position}, part {part.partKey}: {inWords(part)}
          </li>
        ))}
      </ul>
    </Section>
  );
}

function inWords({ forPerson, forChecker }: WaitingPart): string {
  const answers = (count: number) => `${count} ${count === 1 ? 'answer' : 'answers'}`;
  return [
    forPerson === 0 ? null : `${answers(forPerson)} for a person`,
    forChecker === 0 ? null : `${answers(forChecker)} for the checker`,
  ]
    .filter((words) => words !== null)
    .join(', ');
}
