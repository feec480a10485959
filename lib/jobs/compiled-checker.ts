import { createHash, randomUUID } from 'node:crypto';
import { access, mkdir, rename, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { compile } from '@/scripts/checks/compile.mjs';

/**
 * Compiles the checker's thread and gives the path of its script, kept in `folder`. The script is named by its content:
 * it is never stale, and processes that start at once each find it whole, whichever of them put it there.
 */
export async function compiledChecker(
  folder: string = path.join(process.cwd(), '.halfmark', 'compiled'),
): Promise<string> {
  const script = await compile(pathToFileURL(path.join(process.cwd(), 'lib/jobs/checker-worker.ts')));
  const name = createHash('sha256').update(script).digest('hex').slice(0, 32);
  const target = path.join(folder, `checker-${name}.cjs`);
  if (await isThere(target)) return target;
  await mkdir(folder, { recursive: true, mode: 0o700 });
  const incoming = path.join(folder, `incoming-${randomUUID()}`);
  await writeFile(incoming, script, { mode: 0o600 });
  await rename(incoming, target);
  return target;
}

function isThere(file: string): Promise<boolean> {
  return access(file).then(
    () => true,
    () => false,
  );
}
