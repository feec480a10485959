'use client';

import { useActionForm } from '@/app/_components/use-action-form';
import { Field } from '@/components/ui/fields';
import { FormErrorSummary } from '@/components/ui/form-error-summary';
import { SubmitButton } from '@/components/ui/submit-button';
import { useToast } from '@/components/ui/toast';
import { type CourseRole } from '@/lib/domain/roles';
import { invitePerson } from '../actions';
import { PlaceFields } from './place-fields';

type Props = {
  courseId: string;
  roles: readonly CourseRole[];
  sections: readonly { id: string; name: string }[];
};

/** Brings one person into the course. */
export function InviteForm({ courseId, roles, sections }: Props) {
  const toast = useToast();
  const { form, faults } = useActionForm(invitePerson, ({ invited }) =>
    toast(
      invited ? 'In the course; an invitation is on its way.' : 'In the course. This person has an account already.',
    ),
  );
  return (
    <form {...form} className="grid gap-4">
      <FormErrorSummary errors={faults} title="Nobody was brought in" />
      <input type="hidden" name="courseId" value={courseId} />
      <Field name="email" label="E-mail" type="email" autoComplete="off" error={faults['email']} maxLength={254} />
      <Field
        name="name"
        label="Name"
        autoComplete="off"
        hint="Counts only where there is no account yet."
        error={faults['name']}
        maxLength={200}
      />
      <PlaceFields roles={roles} sections={sections} role="student" sectionIds={[]} faults={faults} />
      <div>
        <SubmitButton>Bring in</SubmitButton>
      </div>
    </form>
  );
}
