import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { hashOf } from '@/scripts/ground/build.mjs';
import { explain, Failure, lastWords } from '@/scripts/ground/failure.mjs';
import { nodeFits, wantedNode } from '@/scripts/ground/node-version.mjs';
import { packagesKey, sameInstall } from '@/scripts/ground/packages.mjs';
import { choose, majorVersion } from '@/scripts/ground/postgres-programs.mjs';

describe('the version of Node.js', () => {
  it('is read from package.json and compared by major and minor', () => {
    const wanted = wantedNode('>=20.19 <21');
    expect(nodeFits('20.19.0', wanted)).toBe(true);
    expect(nodeFits('20.20.2', wanted)).toBe(true);
    expect(nodeFits('20.18.9', wanted)).toBe(false);
    expect(nodeFits('18.20.0', wanted)).toBe(false);
    expect(nodeFits('22.0.0', wanted)).toBe(false);
    expect(() => wantedNode('*')).toThrow(/engines/);
  });
});

describe('installed packages', () => {
  const lock = {
    packages: {
      '': {},
      'node_modules/a': { version: '1.0.0', integrity: 'x' },
      'node_modules/b': { version: '2.0.0', integrity: 'y', optional: true },
    },
  };
  const there = () => true;

  it('match their lock file where every one that is not optional is there in its version', () => {
    const installed = { packages: { 'node_modules/a': { version: '1.0.0', integrity: 'x' } } };
    expect(sameInstall(lock, installed, there)).toBe(true);
    expect(sameInstall(lock, installed, () => false)).toBe(false);
    expect(sameInstall(lock, { packages: {} }, there)).toBe(false);
    expect(sameInstall(lock, { packages: { 'node_modules/a': { version: '1.0.1', integrity: 'x' } } }, there)).toBe(
      false,
    );
    expect(sameInstall(lock, { packages: { ...installed.packages, 'node_modules/c': {} } }, there)).toBe(false);
    expect(sameInstall(lock, null, there)).toBe(false);
  });

  it('are other ones for another lock file, Node.js or platform', () => {
    const keys = [packagesKey('a'), packagesKey('b'), packagesKey('a', '999'), packagesKey('a', undefined, 'moon-z80')];
    expect(new Set(keys).size).toBe(4);
    expect(packagesKey('a')).toBe(keys[0]);
  });
});

describe('the hash of the sources', () => {
  it('changes with a byte, a name and a new file, and with nothing else', () => {
    const folder = mkdtempSync(path.join(os.tmpdir(), 'halfmark-hash-'));
    const write = (name: string, text: string) => writeFileSync(path.join(folder, name), text);
    mkdirSync(path.join(folder, 'app'));
    const hashes = [hashOf(folder, ['app', 'missing'])];
    const note = () => hashes.push(hashOf(folder, ['app', 'missing']));
    write('app/one', 'text');
    note();
    write('app/one', 'texts');
    note();
    write('app/two', '');
    note();
    rmSync(path.join(folder, 'app/two'));
    write('app/on', 'etexts');
    rmSync(path.join(folder, 'app/one'));
    note();
    expect(new Set(hashes).size).toBe(5);
    write('outside', 'text');
    expect(hashOf(folder, ['app', 'missing'])).toBe(hashes[4]);
    rmSync(folder, { recursive: true });
  });
});

describe('PostgreSQL on this machine', () => {
  it('is chosen by version: the newest that serves, or the very one that a cluster needs', () => {
    const found = [13, 16, 15].map((version) => ({ folder: `/pg/${version}`, version }));
    expect(choose(found, null)?.version).toBe(16);
    expect(choose(found, 15)?.version).toBe(15);
    expect(choose(found, 14)).toBeNull();
    expect(choose([{ folder: '/pg/13', version: 13 }], null)).toBeNull();
  });

  it('says its major version', () => {
    expect(majorVersion('postgres (PostgreSQL) 15.18 (Debian 15.18-0+deb12u1)\n')).toBe(15);
    expect(majorVersion('something else')).toBeNull();
    expect(majorVersion(null)).toBeNull();
  });
});

describe('failures', () => {
  it('are one line of cause and cure', () => {
    expect(new Failure('It\n broke.', 'Mend  it.').message).toBe('It broke. Mend it.');
    expect(lastWords('  a\n b  ')).toBe('a b');
    expect(lastWords('x'.repeat(400))).toHaveLength(301);
  });

  it('explain a full disk and a missing right, and leave the unknown alone', () => {
    const full = explain(Object.assign(new Error('no'), { code: 'ENOSPC' }), '/srv');
    expect(full).toBeInstanceOf(Failure);
    expect(String(full)).toMatch(/disk that holds \/srv is full\. Free some space/);
    expect(explain(Object.assign(new Error('no'), { code: 'EACCES', path: '/x' }))).toBeInstanceOf(Failure);
    const defect = new TypeError('x is not a function');
    expect(explain(defect)).toBe(defect);
  });
});
