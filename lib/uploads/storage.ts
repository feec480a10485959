import { createHash, randomUUID } from 'node:crypto';
import { createReadStream, type ReadStream } from 'node:fs';
import { mkdir, rename, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import { pipeline } from 'node:stream/promises';
import { environment } from '@/lib/env';

/** A file that is kept: it is named by its content, never by what an uploader called it. */
export type KeptFile = { contentHash: string; byteSize: number };

/** A place beside the kept files for an upload that is still coming in; on the same disk, so that keeping it is a rename. */
export async function incomingFolder(): Promise<string> {
  const folder = path.join(uploadsRoot(), 'incoming');
  await mkdir(folder, { recursive: true, mode: 0o700 });
  return folder;
}

/** Keeps an uploaded file under the hash of its content; the same content twice is kept once. The source is gone after. */
export async function keepFile(incomingPath: string): Promise<KeptFile> {
  const hash = createHash('sha256');
  await pipeline(createReadStream(incomingPath), hash);
  const contentHash = hash.digest('hex');
  const { size } = await stat(incomingPath);
  const target = pathOf(contentHash);
  await mkdir(path.dirname(target), { recursive: true, mode: 0o700 });
  await rename(incomingPath, target);
  return { contentHash, byteSize: size };
}

/** Reads a kept file from its beginning. */
export function readKept(contentHash: string): ReadStream {
  return createReadStream(pathOf(contentHash));
}

/** Throws away an upload that is not kept; nothing happens where it is gone already. */
export async function discardIncoming(incomingPath: string): Promise<void> {
  await rm(incomingPath, { force: true });
}

/** A fresh name for an incoming file. */
export function incomingName(): string {
  return randomUUID();
}

function uploadsRoot(): string {
  return path.resolve(environment().uploadsDir);
}

function pathOf(contentHash: string): string {
  if (!/^[0-9a-f]{64}$/.test(contentHash)) throw new RangeError('A kept file is named by its SHA-256.');
  return path.join(uploadsRoot(), 'kept', contentHash.slice(0, 2), contentHash);
}
