import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { compiledChecker } from '@/lib/jobs/compiled-checker';

const folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-compiled-'));

afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the compiled checker', () => {
  it('is one whole script where several ask for it at once, and stays the same for the next', async () => {
    const asked = await Promise.all(Array.from({ length: 4 }, () => compiledChecker(folder)));
    const [first] = asked;
    if (first === undefined) throw new Error('Four were asked for.');
    expect(new Set(asked)).toEqual(new Set([first]));
    expect(readdirSync(folder)).toEqual([path.basename(first)]);
    const script = readFileSync(first, 'utf8');
    expect(await compiledChecker(folder)).toBe(first);
    expect(readFileSync(first, 'utf8')).toBe(script);
  });

  it('needs no loader of TypeScript, nor any package', async () => {
    const loaded: unknown = await import(await compiledChecker(folder));
    expect(loaded).toHaveProperty('default.default', expect.any(Function));
    const required = readFileSync(await compiledChecker(folder), 'utf8').matchAll(/\brequire\("([^"]+)"\)/g);
    expect([...required].map(([, name]) => name).filter((name) => !name?.startsWith('node:'))).toEqual([]);
  });
});
