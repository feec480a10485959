/** A typeset matrix or column taken apart: TeX of each element, row by row, and what stands before and behind it. */
export type MatrixElements = { before: string; rows: string[][]; behind: string };

const environment = /^([\s\S]*?)\\begin\{pmatrix\}([\s\S]*)\\end\{pmatrix\}([\s\S]*)$/;

/**
 * Takes TeX of our own printer with one `pmatrix` apart, so that elements can be marked one by one; null where it has
 * none or several, or rows of different lengths.
 */
export function matrixElements(latex: string): MatrixElements | null {
  const match = environment.exec(latex);
  const body = match?.[2];
  if (!match || body === undefined || body.includes('\\begin{')) return null;
  const rows = splitOutside(body, '\\\\').map((row) => splitOutside(row, '&').map((cell) => cell.trim()));
  const width = rows[0]?.length ?? 0;
  if (width === 0 || rows.some((row) => row.length !== width)) return null;
  return { before: (match[1] ?? '').trim(), rows, behind: (match[3] ?? '').trim() };
}

/** Splits at a separator that stands outside braces. */
function splitOutside(text: string, separator: string): string[] {
  const pieces: string[] = [];
  let depth = 0;
  let from = 0;
  for (let at = 0; at < text.length; at += 1) {
    const character = text[at];
    if (depth === 0 && text.startsWith(separator, at)) {
      pieces.push(text.slice(from, at));
      at += separator.length - 1;
      from = at + 1;
    } else if (character === '\\') {
      at += 1;
    } else if (character === '{') {
      depth += 1;
    } else if (character === '}') {
      depth -= 1;
    }
  }
  pieces.push(text.slice(from));
  return pieces;
}
