/** Names and labels as LaTeX. */
import { greekNames } from './characters';
import { nameParts } from './scope';
import { type WrittenLabel } from './tree';

/** A declared name as LaTeX: `omega_1` is `\omega_{1}`, a word is set upright. */
export function latexName(name: string): string {
  const parts = nameParts(name);
  if (parts === null) return latexWord(name);
  const primes = "'".repeat(parts.primes);
  const base = latexWord(parts.base);
  return parts.index === '' ? base + primes : `${base}_{${latexIndex(parts.index)}}${primes}`;
}

/** One letter as it is, a Greek letter as its command, a longer word upright. */
export function latexWord(word: string): string {
  if (word === 'ħ') return '\\hbar';
  if (word === 'ℓ') return '\\ell';
  const greek = greekNames.get(word);
  if (greek !== undefined) return `\\${greek}`;
  return [...word].length === 1 ? word : upright(word);
}

function upright(word: string): string {
  let text = '';
  for (const letter of word) {
    const greek = greekNames.get(letter);
    text += letter === 'ħ' ? '\\hbar ' : greek === undefined ? letter : `\\${greek} `;
  }
  return `\\mathrm{${text.trim()}}`;
}

/** An index: digits and signs as they are, a word upright. */
export function latexIndex(index: string): string {
  if (/^[A-Za-z]{2,}$/.test(index)) return `\\mathrm{${index}}`;
  let text = '';
  for (const character of index) text += indexCharacter(character);
  return text.trim();
}

function indexCharacter(character: string): string {
  switch (character) {
    case '±':
      return '\\pm ';
    case '∓':
      return '\\mp ';
    case '↑':
      return '\\uparrow ';
    case '↓':
      return '\\downarrow ';
    case 'ħ':
      return '\\hbar ';
    case 'ℓ':
      return '\\ell ';
    default: {
      const greek = greekNames.get(character);
      return greek === undefined ? character : `\\${greek} `;
    }
  }
}

/** The label of a ket or bra. */
export function latexState(written: WrittenLabel): string {
  switch (written) {
    case '↑':
      return '\\uparrow';
    case '↓':
      return '\\downarrow';
    case 'up':
    case 'down':
      return `\\mathrm{${written}}`;
    case '0':
    case '1':
      return written;
    default:
      return `{${written.charAt(0)}}${written.slice(1)}`;
  }
}
