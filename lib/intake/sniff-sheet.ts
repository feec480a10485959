import { fileTypeFromFile } from 'file-type';
import { HalfmarkError } from '@/lib/errors';

/**
 * Looks at what a file really is, whatever it is called: text passes, anything with a known binary signature is refused
 * with its true kind in the message.
 */
export async function assertTextSheet(path: string): Promise<void> {
  const type = await fileTypeFromFile(path);
  if (type === undefined || type.mime.startsWith('text/')) return;
  throw new HalfmarkError(
    'unsupported-type',
    `This is a ${type.ext.toUpperCase()} file, whatever its name says. Save the answers as CSV in UTF-8 and upload that.`,
  );
}
