'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { makeCourse } from '../actions';
import { CourseFields, type CourseValues } from './course-fields';

const blank: CourseValues = {
  code: '',
  title: '',
  term: '',
  timeZone: 'UTC',
  tasSeeOwnSectionsOnly: false,
  notice: '',
};

/** Makes a course. */
export function NewCourseForm({ departments }: { departments: readonly string[] }) {
  const { form, faults } = useActionForm(makeCourse);
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} title="No course was made" />
      <Field
        name="department"
        label="Department"
        hint="One that is there already, or a new one. Its courses share a shelf of templates."
        list="departments"
        defaultValue={departments.length === 1 ? departments[0] : ''}
        error={faults['department']}
        maxLength={200}
      />
      <datalist id="departments">
        {departments.map((name) => (
          <option key={name} value={name} />
        ))}
      </datalist>
      <CourseFields values={blank} faults={faults} />
      <div>
        <SubmitButton>Make the course</SubmitButton>
      </div>
    </form>
  );
}
