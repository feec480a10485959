/**
 * A form's fields as a plain object for a schema: a name that occurs several times, or ends in `[]`, becomes a list
 * (without the brackets, and without empty choices); empty file fields are left out; the fields that React adds for itself are too.
 */
export function formInput(form: FormData): Record<string, FormDataEntryValue | FormDataEntryValue[]> {
  const input: Record<string, FormDataEntryValue | FormDataEntryValue[]> = {};
  for (const name of new Set(form.keys())) {
    if (name.startsWith('$')) continue;
    const values = form.getAll(name).filter((value) => typeof value === 'string' || value.size > 0);
    if (name.endsWith('[]')) input[name.slice(0, -2)] = values.filter((value) => value !== '');
    else if (values.length > 1) input[name] = values;
    else if (values[0] !== undefined) input[name] = values[0];
  }
  return input;
}
