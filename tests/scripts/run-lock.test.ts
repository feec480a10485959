import { mkdtempSync, readFileSync, rmSync, writeFileSync, existsSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { holds, takeLock } from '@/scripts/ground/run-lock.mjs';

let folder = '';
let file = '';

beforeEach(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-lock-'));
  file = path.join(folder, 'running.json');
});

afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe('the lock of a running start', () => {
  it('is held once, says who holds it and where, and can be taken again after its release', async () => {
    const first = await takeLock(file);
    if (!('release' in first)) throw new Error('the lock was free');
    first.note({ url: 'http://127.0.0.1:1' });
    expect(await takeLock(file)).toMatchObject({ holder: { pid: process.pid, url: 'http://127.0.0.1:1' } });
    first.release();
    expect(existsSync(file)).toBe(false);
    expect(await takeLock(file)).toHaveProperty('release');
  });

  it.each([
    ['of a process that is gone', JSON.stringify({ pid: 2 ** 22 + 1, startTicks: 1 })],
    ['whose process id now belongs to another program', JSON.stringify({ pid: process.pid, startTicks: 1 })],
    ['that is no JSON', '{"pid":'],
    ['that names no process', '{}'],
  ])('is taken over from one %s', async (_case, text) => {
    writeFileSync(file, text);
    expect(await takeLock(file)).toHaveProperty('release');
    expect(JSON.parse(readFileSync(file, 'utf8'))).toMatchObject({ pid: process.pid });
  });

  it('goes to one of many that ask at once, also over a stale one', async () => {
    writeFileSync(file, JSON.stringify({ pid: 2 ** 22 + 1 }));
    const answers = await Promise.all(Array.from({ length: 10 }, () => takeLock(file)));
    expect(answers.filter((answer) => 'release' in answer)).toHaveLength(1);
  });

  it('is not held by nobody', () => {
    expect(holds(null)).toBe(false);
    expect(holds({})).toBe(false);
    expect(holds({ pid: process.pid })).toBe(true);
  });
});
