import { ButtonLink } from '@/components/ui/button';
import { MarginNote, Section } from '@/components/ui/script-page';
import { EmptyState } from '@/components/ui/states';
import { paths } from '@/lib/paths';
import { kindName } from '@/lib/presenters/kind-name';
import { type CourseView } from '@/lib/queries/course-for-actor';
import { type SetForStaff } from '@/lib/queries/set-for-staff';
import { type ShelfTemplate } from '@/lib/queries/shelf';
import { AddQuestionForm } from './add-question-form';

interface AddQuestionProps {
  readonly course: CourseView;
  readonly set: SetForStaff;
  readonly shelf: readonly ShelfTemplate[];
  readonly mayChange: boolean;
}

/** Where a question is taken from the shelf into the set. */
export function AddQuestion({ course, set, shelf, mayChange }: AddQuestionProps) {
  if (!mayChange) {
    return (
      <Section>
        <EmptyState title="No questions yet">The instructor has not put any question into this set.</EmptyState>
      </Section>
    );
  }
  const inSet = new Set(set.items.map((item) => item.templateId));
  const choices = shelf.flatMap((template) =>
    template.versionId === null || inSet.has(template.id)
      ? []
      : [
          {
            value: template.versionId,
            label: `${template.name} (version ${template.version}: ${template.kinds.map(kindName).join(', ').toLowerCase()})`,
          },
        ],
  );
  return (
    <Section
      label="Add a question"
      margin={<MarginNote>A question enters with its latest published version, and keeps it.</MarginNote>}
    >
      <h2 className="mb-3">{set.items.length === 0 ? 'First question' : 'Another question'}</h2>
      {choices.length === 0 ? (
        <EmptyState
          title={shelf.length === 0 ? 'The shelf is empty' : 'Nothing more to add'}
          action={<ButtonLink href={paths.templates()}>Go to the shelf</ButtonLink>}
        >
          A question is written on the shelf and published there before it can enter a set.
        </EmptyState>
      ) : (
        <AddQuestionForm
          ids={{ courseId: course.id, problemSetId: set.id, revision: String(set.revision) }}
          choices={choices}
        />
      )}
    </Section>
  );
}
