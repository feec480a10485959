/** Units and SI prefixes that a quantity may carry. Tables only; what they are worth is computed elsewhere. */

/** Canonical unit symbols by spelling. `takesPrefix` units may carry an SI prefix. */
export interface UnitEntry {
  readonly unit: string;
  readonly takesPrefix: boolean;
}

const prefixed = 'Hz s m g A K mol cd N Pa J W C V F S Wb T H eV rad L l G Gy Bq lm lx kat ohm sr'.split(' ');
// `hbar` is no hectobar.
const plain = 'min deg u Da bar'.split(' ');

const entries = new Map<string, UnitEntry>();
for (const unit of prefixed) entries.set(unit, { unit: unit === 'l' ? 'L' : unit, takesPrefix: true });
for (const unit of plain) entries.set(unit, { unit, takesPrefix: false });
for (const [spelling, unit] of [
  ['Ω', 'ohm'],
  ['Ohm', 'ohm'],
  ['hertz', 'Hz'],
  ['Hertz', 'Hz'],
  ['tesla', 'T'],
  ['Tesla', 'T'],
  ['joule', 'J'],
  ['Joule', 'J'],
  ['gauss', 'G'],
  ['Gauss', 'G'],
  ['kelvin', 'K'],
  ['Kelvin', 'K'],
  ['sec', 's'],
  ['second', 's'],
  ['seconds', 's'],
  ['radian', 'rad'],
  ['radians', 'rad'],
  ['meter', 'm'],
  ['metre', 'm'],
] as const) {
  entries.set(spelling, { unit, takesPrefix: true });
}
entries.set('degree', { unit: 'deg', takesPrefix: false });
entries.set('degrees', { unit: 'deg', takesPrefix: false });

/** Every unit, by spelling without prefix. */
export const unitsBySpelling: ReadonlyMap<string, UnitEntry> = entries;

/** SI prefixes by spelling; micro is `u`. */
export const prefixes: ReadonlyMap<string, string> = new Map([
  ...'Q R Y Z E P T G M k h da d c m u n p f a z y r q'.split(' ').map((prefix) => [prefix, prefix] as const),
  ['μ', 'u'],
]);

/** A prefix and a unit. */
export interface NamedUnit {
  readonly prefix: string;
  readonly unit: string;
}

/** The unit a word spells, alone or with a prefix; the unit without prefix comes first (`T`, `min`, `cd`). */
export function unitOf(word: string): NamedUnit | null {
  const alone = entries.get(word);
  if (alone) return { prefix: '', unit: alone.unit };
  for (const length of [1, 2]) {
    const prefix = prefixes.get(word.slice(0, length));
    const entry = entries.get(word.slice(length));
    // Before a command the h would be the Planck constant.
    if (prefix === 'h' && entry?.unit === 'ohm') return null;
    if (prefix !== undefined && entry?.takesPrefix) return { prefix, unit: entry.unit };
  }
  return null;
}

/**
 * The units that a run of letters spells: one unit if it can be, else the longest first (`Nm`, `Js`), with
 * backtracking; null where it spells none.
 */
export function unitsOf(run: string): readonly NamedUnit[] | null {
  const one = unitOf(run);
  if (one) return [one];
  if (run.length > 12) return null;
  for (let length = Math.min(run.length - 1, 9); length >= 1; length -= 1) {
    const first = unitOf(run.slice(0, length));
    const rest = first ? unitsOf(run.slice(length)) : null;
    if (first && rest) return [first, ...rest];
  }
  return null;
}
