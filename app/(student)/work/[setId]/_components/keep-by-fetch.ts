import { type PartRef, type SaveOutcome } from './draft-keeper';

/** Sends a draft to the server and says what came of it; a lost connection is an outcome like any other. */
export async function keepByFetch(
  part: PartRef,
  text: string,
  baseRevision: number,
  leaving: boolean,
): Promise<SaveOutcome> {
  let response: Response;
  try {
    response = await fetch('/api/saved-answers', {
      method: 'PUT',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ ...part, text, baseRevision }),
      keepalive: leaving,
      signal: leaving ? null : AbortSignal.timeout(15_000),
    });
  } catch {
    return { kind: 'offline' };
  }
  if (response.status === 401) return { kind: 'signed-out' };
  // The server's own trouble passes; what it refuses by reason stays refused.
  if (response.status >= 500 || response.status === 429) return { kind: 'offline' };
  const answer: unknown = await response.json().catch(() => null);
  if (response.ok) return outcomeOf(answer);
  return { kind: 'refused', message: textIn(answer, 'detail') ?? 'This could not be saved.' };
}

function outcomeOf(answer: unknown): SaveOutcome {
  if (typeof answer !== 'object' || answer === null || !('revision' in answer)) return { kind: 'offline' };
  const revision = Number(answer.revision);
  const text = textIn(answer, 'text');
  return textIn(answer, 'kind') === 'changed' && text !== null
    ? { kind: 'changed', text, revision }
    : { kind: 'saved', revision };
}

function textIn(answer: unknown, name: string): string | null {
  if (typeof answer !== 'object' || answer === null || !(name in answer)) return null;
  const value = (answer as Record<string, unknown>)[name];
  return typeof value === 'string' ? value : null;
}
