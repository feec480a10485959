import { paths } from '@/lib/paths';
import { type Row } from '../matrix/row';

/** Checking against a reference: for the staff of any course and administrators, never for a student. */
export const rows: readonly Row[] = [
  {
    kind: 'page',
    file: '(tools)/bench/page.tsx',
    path: paths.bench,
    expect: ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'route',
    file: 'api/v1/checks/route.ts',
    method: 'POST',
    path: () => '/api/v1/checks',
    body: () => ({ checks: [{ id: 'one', kind: 'scalar', reference: '2', answer: '1 + 1' }] }),
    expect: ['sign-in', 'refuse', 'allow', 'allow', 'allow', 'allow', 'allow'],
  },
  {
    kind: 'open',
    file: 'api/v1/openapi.json/route.ts',
    name: 'GET',
    path: () => '/api/v1/openapi.json',
    why: 'It tells how the HTTP interface is asked, and nothing about anyone.',
  },
];
