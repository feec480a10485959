import { DataTable } from '@/components/ui/data-table';
import { EmptyState } from '@/components/ui/states';
import { courseRoles, roleName } from '@/lib/domain/roles';
import { paths } from '@/lib/paths';
import { type RosterPerson } from '@/lib/queries/roster';

type Props = { courseId: string; people: readonly RosterPerson[]; mayChange: boolean };

/** Everyone in the course; a name leads to the person's place for those who may change it. */
export function RosterTable({ courseId, people, mayChange }: Props) {
  const rows = people.map((person) => ({
    id: person.membershipId,
    cells: {
      name: {
        value: person.name,
        ...(mayChange ? { href: paths.rosterPerson(courseId, person.membershipId) } : {}),
      },
      email: person.email,
      role: { value: courseRoles.indexOf(person.role), text: roleName(person.role) },
      sections: person.sections.map((section) => section.name).join(', '),
      state: stateOf(person),
    },
  }));
  return (
    <DataTable
      caption="People"
      columns={columns}
      rows={rows}
      empty={
        <EmptyState title="Nobody to show yet.">
          People appear here once they are brought into the course, or into a section you grade.
        </EmptyState>
      }
    />
  );
}

function stateOf(person: RosterPerson): string {
  if (person.isDeactivated) return 'account closed';
  return person.hasPassword ? '' : 'invited';
}

const columns = [
  { key: 'name', label: 'Name', heading: true },
  { key: 'email', label: 'E-mail' },
  { key: 'role', label: 'Role' },
  { key: 'sections', label: 'Sections' },
  { key: 'state', label: 'Account' },
] as const;
