import { readdir } from 'node:fs/promises';
import path from 'node:path';

/** A migration's file name: fourteen digits of UTC time, then a verb and its object. */
const fileName = /^\d{14}-[a-z0-9-]+\.ts$/;

/** The folder of migrations; every process of Halfmark runs in the project's root. */
export function migrationsFolder(): string {
  return path.join(process.cwd(), 'migrations');
}

/** The names of all migrations there are, oldest first. Throws when a file in the folder is not named as one. */
export async function migrationNames(folder: string = migrationsFolder()): Promise<string[]> {
  const names = (await readdir(/* turbopackIgnore: true */ folder)).filter((name) => name.endsWith('.ts')).sort();
  const odd = names.find((name) => !fileName.test(name));
  if (odd !== undefined) throw new Error(`migrations/${odd} is not named YYYYMMDDHHMMSS-verb-object.ts.`);
  return names;
}
