import Link from 'next/link';
import { Section } from '@/components/ui/script-page';
import { formatCredit } from '@/lib/domain/credit';
import { paths } from '@/lib/paths';
import { kindName } from '@/lib/presenters/kind-name';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { type ItemForStaff, type SetForStaff } from '@/lib/queries/set-for-staff';
import { QuestionControls } from './question-controls';

interface QuestionRowProps {
  readonly course: CourseView;
  readonly set: SetForStaff;
  readonly item: ItemForStaff;
  readonly mayChange: boolean;
}

/** One question of a set: what it asks for, its points in the margin, and what may be done with it. */
export function QuestionRow({ course, set, item, mayChange }: QuestionRowProps) {
  const order = set.items.map((other) => other.id);
  return (
    <Section
      label={`Question ${item.position}`}
      margin={
        <div className="grid gap-3">
          <p className="flex items-baseline gap-x-2">
            <span className="text-mark font-semibold">{formatCredit(item.points)}</span>
            <span className="text-small text-grey">{item.points === 1000 ? 'mark' : 'marks'}</span>
          </p>
          {item.draws > 0 ? (
            <p className="text-small text-grey">
              {item.draws} {item.draws === 1 ? 'student has' : 'students have'} a draw
            </p>
          ) : null}
          {mayChange ? (
            <QuestionControls
              ids={{ courseId: course.id, problemSetId: set.id, revision: String(set.revision), itemId: item.id }}
              points={formatCredit(item.points)}
              title={item.title}
              order={order}
            />
          ) : null}
        </div>
      }
    >
      <p className="mb-1 text-small text-grey">
        Question {item.position} · version {item.version}
        {item.newerVersion === null ? null : ` · version ${item.newerVersion} is on the shelf`}
      </p>
      <p className="text-lead font-semibold">
        <Link href={paths.template(item.templateId)} className="text-ink">
          {item.title}
        </Link>
      </p>
      <ul className="mt-2 grid gap-0.5 text-small">
        {item.parts.map((part) => (
          <li key={part.key} className="flex max-w-form justify-between gap-4">
            <span>
              <span className="font-semibold">{part.key}.</span> {kindName(part.kind)}
            </span>
            <span className="text-grey">{formatCredit(part.outOf)}</span>
          </li>
        ))}
      </ul>
    </Section>
  );
}
