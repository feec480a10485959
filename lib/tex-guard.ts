/** Longest formula that is typeset, in UTF-16 units: the printed form of the longest answer with room to spare. */
export const longestTex = 20_000;

const refusedCommands =
  /\\(?:href|url|includegraphics|html[A-Za-z]*|[gex]?def|(?:future)?let|global|(?:re|provide)?newcommand|newcommand|rule|csname|input|include)(?![A-Za-z])/;

/**
 * Why a text may not be handed to a typesetter whose limits cannot be set, or null when it may: it is too long, or uses a
 * command that defines, links or draws. What our own printer writes always passes.
 */
export function refusedTex(latex: string): string | null {
  if (latex.length > longestTex) return 'This formula is too long to be typeset.';
  const command = refusedCommands.exec(latex)?.[0];
  return command ? `The command ${command} is not typeset here.` : null;
}
