'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { type CourseRole } from '@/lib/domain/roles';
import { PlaceFields } from '../../_components/place-fields';
import { savePlace } from '../../actions';

type Props = {
  courseId: string;
  membershipId: string;
  roles: readonly CourseRole[];
  sections: readonly { id: string; name: string }[];
  role: CourseRole;
  sectionIds: readonly string[];
};

/** Changes what a person is in the course. */
export function PlaceForm({ courseId, membershipId, ...place }: Props) {
  const { form, faults } = useActionForm(savePlace);
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} />
      <input type="hidden" name="courseId" value={courseId} />
      <input type="hidden" name="membershipId" value={membershipId} />
      <PlaceFields {...place} faults={faults} />
      <div>
        <SubmitButton>Save</SubmitButton>
      </div>
    </form>
  );
}
