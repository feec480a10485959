/** The characters with which a spreadsheet takes a cell for a formula (OWASP, CSV injection). */
const formulaStart = /^[=+\-@\t\r]/;

/**
 * A text as it may stand in a cell of an exported sheet: what a spreadsheet would work out as a formula is given a
 * leading apostrophe, which shows it as text. `-i hbar S_z` is such a text.
 */
export function neutraliseFormula(text: string): string {
  return formulaStart.test(text) ? `'${text}` : text;
}

/** Undoes it where a sheet of ours comes back: an apostrophe in front of such a text is taken off. */
export function withoutNeutralising(text: string): string {
  return text.startsWith("'") && formulaStart.test(text.slice(1)) ? text.slice(1) : text;
}
