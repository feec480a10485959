import { readJson } from './files.mjs';
import { projectRoot } from './folders.mjs';

/** @returns {{ password: string, accounts: { role: string, name: string, email: string }[] } | null} */
export function demoAccounts() {
  return readJson(`${projectRoot}/seeders/demo-accounts.json`);
}

/** Whether a database holds one of the demo's accounts. */
export async function hasDemo(client) {
  if (!(await hasTable(client, 'users'))) return false;
  const emails = (demoAccounts()?.accounts ?? []).map(({ email }) => email);
  const { rows } = await client.query('select from users where email = any($1) limit 1', [emails]);
  return rows.length > 0;
}

/** Whether a database has tables but no course and no person in it. */
export async function isEmpty(client) {
  if (!(await hasTable(client, 'courses'))) return false;
  const { rows } = await client.query('select from courses union all select from users limit 1');
  return rows.length === 0;
}

async function hasTable(client, name) {
  const { rows } = await client.query('select to_regclass($1) is not null as found', [`public.${name}`]);
  return rows[0].found;
}
