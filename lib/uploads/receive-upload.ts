import { stat } from 'node:fs/promises';
import path from 'node:path';
import { Readable } from 'node:stream';
import type { IncomingMessage } from 'node:http';
import type { ReadableStream } from 'node:stream/web';
import { errors as formidableErrors, formidable } from 'formidable';
import { HalfmarkError } from '@/lib/errors';
import { discardIncoming, incomingFolder, incomingName } from './storage';

/** One file as it came in, on disk but not yet kept. */
export type Upload = { incomingPath: string; originalName: string };

/** Bytes beside the file itself: boundaries, headers of the parts. */
const ENVELOPE_BYTES = 64 * 1024;

/**
 * Takes the one file of a multipart request, streamed to disk, and refuses more than `maxBytes` of it, more than one
 * file, or none. The caller keeps or discards it.
 */
export async function receiveUpload(request: Request, maxBytes: number): Promise<Upload> {
  const announced = Number(request.headers.get('content-length') ?? '0');
  if (announced > maxBytes + ENVELOPE_BYTES) throw tooLarge(maxBytes);
  const uploadDir = await incomingFolder();
  const begun: string[] = [];
  const form = formidable({
    uploadDir,
    filename: () => {
      const name = incomingName();
      begun.push(path.join(uploadDir, name));
      return name;
    },
    maxFiles: 1,
    maxFileSize: maxBytes,
    maxFields: 20,
    maxFieldsSize: ENVELOPE_BYTES,
    allowEmptyFiles: false,
    minFileSize: 1,
  });
  const message = asIncomingMessage(request);
  try {
    const [, files] = await form.parse(message);
    const file = Object.values(files).flat()[0];
    if (!file) throw new HalfmarkError('invalid', undefined, { fields: { file: 'Choose a file.' } });
    await stat(file.filepath);
    return { incomingPath: file.filepath, originalName: plainName(file.originalFilename) };
  } catch (error) {
    for (const cutShort of begun) await discardIncoming(cutShort);
    throw refusalOf(error, maxBytes);
  } finally {
    message.destroy();
  }
}

/** What a web request looks like to formidable, which reads Node's own. */
function asIncomingMessage(request: Request): IncomingMessage & Readable {
  if (!request.body) throw new HalfmarkError('invalid', undefined, { fields: { file: 'Choose a file.' } });
  const headers: Record<string, string> = Object.fromEntries(request.headers);
  if (!('content-length' in headers)) headers['transfer-encoding'] = 'chunked';
  const stream = Readable.fromWeb(request.body as ReadableStream<Uint8Array>);
  return Object.assign(stream, { headers, method: request.method, url: request.url }) as unknown as IncomingMessage &
    Readable;
}

function refusalOf(error: unknown, maxBytes: number): Error {
  if (error instanceof HalfmarkError) return error;
  const code = typeof error === 'object' && error !== null && 'code' in error ? error.code : undefined;
  if (code === formidableErrors.biggerThanMaxFileSize || code === formidableErrors.biggerThanTotalMaxFileSize) {
    return tooLarge(maxBytes);
  }
  if (code === formidableErrors.noEmptyFiles || code === formidableErrors.smallerThanMinFileSize) {
    return new HalfmarkError('invalid', undefined, { fields: { file: 'The file is empty.' } });
  }
  if (code === formidableErrors.maxFilesExceeded) {
    return new HalfmarkError('invalid', undefined, { fields: { file: 'Choose one file at a time.' } });
  }
  const status = typeof error === 'object' && error !== null && 'httpCode' in error ? error.httpCode : undefined;
  if (status === 415 || status === 400) {
    return new HalfmarkError('invalid', 'The upload was cut short or is not a form. Choose the file again.', { cause: error });
  }
  return error instanceof Error ? error : new Error('An upload could not be read.');
}

function tooLarge(maxBytes: number): HalfmarkError {
  const megabytes = Math.round(maxBytes / 1024 / 1024);
  return new HalfmarkError(
    'too-large',
    `The file is larger than ${megabytes} MB. Split it, or leave out columns that are not needed.`,
  );
}

/** A name to show, never to use as a path: without folders, control characters and excess length. */
function plainName(name: string | null): string {
  const last = path.posix.basename((name ?? '').replaceAll('\\', '/'));
  const shown = Array.from(last, (character) => (character < ' ' || character === '\u007f' ? '' : character)).join('');
  return shown.slice(0, 200) || 'file';
}
