/** An answer on its way to being handed in. */
export interface SentAnswer {
  readonly partKey: string;
  readonly text: string;
}

/** The browser's memory, as far as a hand-in needs it. */
export type HandInMemory = Pick<Storage, 'getItem' | 'setItem' | 'removeItem'>;

/**
 * The key of a hand-in: the same for the same answers until the server has answered, also after a reload or a lost
 * connection, so that pressing again stores them once; a new one for any other answers.
 */
export function keyForHandIn(memory: HandInMemory, drawId: string, answers: readonly SentAnswer[]): string {
  const content = JSON.stringify(answers.map(({ partKey, text }) => [partKey, text]));
  try {
    const held: unknown = JSON.parse(memory.getItem(nameOf(drawId)) ?? 'null');
    if (isHeld(held) && held.content === content) return held.clientKey;
    const clientKey = newKey();
    memory.setItem(nameOf(drawId), JSON.stringify({ clientKey, content }));
    return clientKey;
  } catch {
    return newKey();
  }
}

/** The server has answered: the next hand-in is another one. */
export function forgetHandIn(memory: HandInMemory, drawId: string): void {
  try {
    memory.removeItem(nameOf(drawId));
  } catch {
    // A browser without memory of its own has nothing to forget.
  }
}

function nameOf(drawId: string): string {
  return `halfmark.hand-in.${drawId}`;
}

/** A random uuid (RFC 9562, version 4), also where `randomUUID` is missing: on plain http it is. */
function newKey(): string {
  if (typeof crypto.randomUUID === 'function') return crypto.randomUUID();
  const bytes = crypto.getRandomValues(new Uint8Array(16));
  bytes[6] = ((bytes[6] ?? 0) & 0x0f) | 0x40;
  bytes[8] = ((bytes[8] ?? 0) & 0x3f) | 0x80;
  const hex = Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}

function isHeld(value: unknown): value is { clientKey: string; content: string } {
  return (
    typeof value === 'object' &&
    value !== null &&
    'clientKey' in value &&
    typeof value.clientKey === 'string' &&
    'content' in value &&
    typeof value.content === 'string'
  );
}
