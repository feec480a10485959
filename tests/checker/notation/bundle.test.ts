import { relative } from 'node:path';
import { gzipSync } from 'node:zlib';
import { build, type Rolldown } from 'vite';
import { describe, expect, it } from 'vitest';

const root = `${import.meta.dirname}/../../..`;

describe('the reader in a browser', () => {
  it('is small and holds nothing but the reader', async () => {
    const result = (await build({
      root,
      configFile: false,
      logLevel: 'silent',
      build: {
        write: false,
        minify: true,
        rollupOptions: {
          input: `${root}/lib/checker/reader.ts`,
          preserveEntrySignatures: 'strict',
          output: { format: 'es' },
        },
      },
    })) as Rolldown.RolldownOutput;
    const chunks = result.output.filter((chunk) => chunk.type === 'chunk');
    const size = chunks.reduce((sum, { code }) => sum + gzipSync(code).length, 0);
    expect(chunks).toHaveLength(1);
    expect(size).toBeLessThan(30_000);
    const modules = chunks.flatMap(({ moduleIds }) => moduleIds).map((id) => relative(root, id));
    const foreign = modules.filter((id) => !/^lib\/checker\/(notation\/[a-z-]+|diagnostics|reader)\.ts$/.test(id));
    expect(foreign).toEqual([]);
  }, 60_000);
});
