'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { saveCourse } from '../actions';
import { CourseFields, type CourseValues } from './course-fields';

type Props = { courseId: string; values: CourseValues & { retentionMonths: number } };

/** Changes a course. */
export function EditCourseForm({ courseId, values }: Props) {
  const toast = useToast();
  const { form, faults } = useActionForm(saveCourse, () => toast('The course is saved.'));
  return (
    <form key={JSON.stringify(values)} {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} />
      <input type="hidden" name="courseId" value={courseId} />
      <CourseFields values={values} faults={faults} />
      <Field
        name="retentionMonths"
        label="Months that student data is kept after the term"
        type="number"
        min={1}
        max={1200}
        defaultValue={values.retentionMonths}
        error={faults['retentionMonths']}
      />
      <div>
        <SubmitButton>Save</SubmitButton>
      </div>
    </form>
  );
}
