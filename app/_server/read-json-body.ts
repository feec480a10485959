import 'server-only';
import { HalfmarkError } from '@/lib/errors';

/**
 * A request's body as JSON, read no further than `longest` bytes.
 *
 * @throws HalfmarkError `too-large`; `invalid` where it is no JSON
 */
export async function readJsonBody(request: Request, longest: number): Promise<unknown> {
  if (Number(request.headers.get('content-length') ?? 0) > longest) throw new HalfmarkError('too-large');
  const pieces: Uint8Array[] = [];
  let size = 0;
  const reader = request.body?.getReader();
  for (let next = await reader?.read(); next?.value !== undefined; next = await reader?.read()) {
    size += next.value.byteLength;
    if (size > longest) {
      await reader?.cancel();
      throw new HalfmarkError('too-large');
    }
    pieces.push(next.value);
  }
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(pieces)));
  } catch {
    throw new HalfmarkError('invalid', 'The request is not JSON.');
  }
}
