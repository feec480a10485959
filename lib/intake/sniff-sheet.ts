import { open } from 'node:fs/promises';
import { fileTypeFromFile } from 'file-type';
import { HalfmarkError } from '@/lib/errors';

/**
 * Looks at what a file really is, whatever it is called: text passes, anything with a known binary signature is refused
 * with its true kind in the message.
 */
export async function assertTextSheet(path: string): Promise<void> {
  if (await beginsWithMark(path)) return;
  const type = await fileTypeFromFile(path);
  if (type === undefined || type.mime.startsWith('text/')) return;
  throw new HalfmarkError(
    'unsupported-type',
    `This is a ${type.ext.toUpperCase()} file, whatever its name says. Save the answers as CSV in UTF-8 and upload that.`,
  );
}

/** Byte order marks of UTF-8 and of UTF-16 both ways; the last two are also how some sound files may begin. */
const marks = [Buffer.from([0xef, 0xbb, 0xbf]), Buffer.from([0xff, 0xfe]), Buffer.from([0xfe, 0xff])];

async function beginsWithMark(path: string): Promise<boolean> {
  const file = await open(path);
  try {
    const { buffer, bytesRead } = await file.read(Buffer.alloc(4), 0, 4, 0);
    const head = buffer.subarray(0, bytesRead);
    // FF FE 00 00 is UTF-32, which is not read here.
    if (head.equals(Buffer.from([0xff, 0xfe, 0, 0]))) return false;
    return marks.some((mark) => head.subarray(0, mark.length).equals(mark));
  } finally {
    await file.close();
  }
}
