import { readFileSync } from 'node:fs';
import path from 'node:path';

/** A server action of the build: the id it is called by, and which function of which file under app/ it is. */
export type BuiltAction = { id: string; key: string; page: string };

type Manifest = {
  node: Record<string, { exportedName?: string; filename?: string; workers: Record<string, unknown> }>;
};

/**
 * Every server action that the build can be asked for, as its manifest names them. `page` is the address, with its
 * parameters still in brackets, of a page that carries it.
 */
export function builtActions(buildFolder: string): BuiltAction[] {
  const file = path.resolve(import.meta.dirname, '../../..', buildFolder, 'server/server-reference-manifest.json');
  const { node } = JSON.parse(readFileSync(file, 'utf8')) as Manifest;
  return Object.entries(node).map(([id, { exportedName, filename, workers }]) => {
    if (exportedName === undefined || filename === undefined) throw new Error(`The build does not name action ${id}.`);
    const worker = Object.keys(workers)[0] ?? '';
    const page = worker
      .replace(/^app/, '')
      .replace(/\/\([^)]*\)/g, '')
      .replace(/\/page$/, '');
    return { id, key: `${filename.replace(/^app\//, '')}#${exportedName}`, page: page === '' ? '/' : page };
  });
}

/** Calls a server action with an empty form as a browser would; gives the body of the answer. */
export async function callAction(
  url: string,
  action: BuiltAction,
  headers: Record<string, string>,
): Promise<{ status: number; text: string }> {
  const form = new FormData();
  // React's encoding of one argument that is a form: argument list first, then the form's own fields under its number.
  form.set('0', '["$K1"]');
  form.set('1_nothing', '');
  const address = url + action.page.replace(/\[[^\]]*\]/g, '00000000-0000-4000-8000-000000000000');
  const response = await fetch(address, {
    method: 'POST',
    redirect: 'manual',
    headers: { 'next-action': action.id, accept: 'text/x-component', ...headers },
    body: form,
  });
  return { status: response.status, text: await response.text() };
}
