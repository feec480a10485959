import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

/**
 * Compiles a TypeScript entry with all it imports into one script for a thread. Loading it through tsx would mark every
 * inner function with its name each time it is made, which doubles the time of a check.
 */
export async function compile(entry) {
  const result = await build({
    entryPoints: [fileURLToPath(entry)],
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'cjs',
    write: false,
    logLevel: 'silent',
  });
  return result.outputFiles[0].text;
}
