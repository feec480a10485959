'use client';

import { type FieldFaults } from '@/app/_server/action-result';
import { Checkbox, Field, TextArea } from '@/components/ui/fields';

/** A course as its form holds it. */
export type CourseValues = {
  code: string;
  title: string;
  term: string;
  timeZone: string;
  tasSeeOwnSectionsOnly: boolean;
  notice: string;
};

/** The fields that making and changing a course have in common. */
export function CourseFields({ values, faults }: { values: CourseValues; faults: FieldFaults }) {
  return (
    <>
      <Field
        name="code"
        label="Code"
        hint="As in the catalogue, such as PHY 342."
        defaultValue={values.code}
        error={faults['code']}
        maxLength={40}
      />
      <Field name="title" label="Title" defaultValue={values.title} error={faults['title']} maxLength={200} />
      <Field name="term" label="Term" defaultValue={values.term} error={faults['term']} maxLength={60} />
      <Field
        name="timeZone"
        label="Time zone"
        hint="All times of the course are told in it, such as Europe/London."
        defaultValue={values.timeZone}
        error={faults['timeZone']}
        maxLength={64}
      />
      <Checkbox
        name="tasSeeOwnSectionsOnly"
        label="TAs see the answers of their own sections only"
        defaultChecked={values.tasSeeOwnSectionsOnly}
      />
      <TextArea
        name="notice"
        label="Notice"
        hint="The rules of the course and the institution that students should find beside their marks."
        optional
        defaultValue={values.notice}
        error={faults['notice']}
        maxLength={4000}
      />
    </>
  );
}
