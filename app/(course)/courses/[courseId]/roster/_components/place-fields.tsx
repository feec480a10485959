'use client';

import { useState } from 'react';
import { type FieldFaults } from '@/app/_server/action-result';
import { Checkbox, FieldGroup, Select } from '@/components/ui/fields';
import { FieldErrorLine } from '@/components/ui/field-frame';
import { roleName, type CourseRole } from '@/lib/domain/roles';

type Props = {
  roles: readonly CourseRole[];
  sections: readonly { id: string; name: string }[];
  role: CourseRole;
  sectionIds: readonly string[];
  faults: FieldFaults;
};

/** A role, and the sections that go with it: one for a student, any number for a TA, none for those who see all. */
export function PlaceFields({ roles, sections, role: first, sectionIds, faults }: Props) {
  const [role, setRole] = useState(first);
  const hasSections = sections.length > 0 && (role === 'student' || role === 'ta');
  return (
    <>
      <Select
        name="role"
        label="Role"
        value={role}
        onChange={(event) => setRole(roles.find((one) => one === event.target.value) ?? role)}
        options={roles.map((one) => ({ value: one, label: roleName(one) }))}
        error={faults['role']}
      />
      {hasSections && role === 'student' ? (
        <Select
          name="sectionIds[]"
          id="field-sectionIds"
          label="Section"
          optional
          empty="none"
          defaultValue={sectionIds[0] ?? ''}
          options={sections.map(({ id, name }) => ({ value: id, label: name }))}
          error={faults['sectionIds']}
        />
      ) : null}
      {hasSections && role === 'ta' ? (
        <FieldGroup legend="Grades" hint="Which answers a TA sees follows from this where the course says so.">
          {sections.map(({ id, name }) => (
            <Checkbox
              key={id}
              id={`section-${id}`}
              name="sectionIds[]"
              value={id}
              label={name}
              defaultChecked={sectionIds.includes(id)}
            />
          ))}
          <FieldErrorLine id="field-sectionIds" error={faults['sectionIds']} />
        </FieldGroup>
      ) : null}
    </>
  );
}
