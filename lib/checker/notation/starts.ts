/** Which tokens can begin or end an operand. */
import { type Token } from './token';

/** Whether an operand can begin with this token. */
export function startsOperand(token: Token): boolean {
  switch (token.kind) {
    case 'number':
    case 'vulgar':
    case 'word':
    case 'unknown':
    case 'ket':
    case 'bra':
    case 'named-ket':
    case 'bar-open':
    case 'root':
    case 'frac':
    case 'overline':
    case '(':
    case '[':
    case '{':
    case 'begin':
      return true;
    case '<':
      // The relation of a condition is written `<`; the angle of a bra that is none is written `⟨`.
      return token.text === '⟨';
    default:
      return false;
  }
}

/** Whether a token can be the last of an operand. */
export function endsOperand(token: Token | undefined): boolean {
  switch (token?.kind) {
    case 'number':
    case 'vulgar':
    case 'word':
    case 'unknown':
    case 'superscript':
    case 'subscript':
    case 'ket':
    case 'bra':
    case 'named-ket':
    case 'bar-close':
    case 'dagger':
    case 'transpose':
    case 'prime':
    case 'degree':
    case 'end-environment':
    case ')':
    case ']':
    case '}':
    case '>':
      return true;
    default:
      return false;
  }
}

/** +1 for an opening bracket, −1 for a closing one. */
export function nesting(token: Token): number {
  switch (token.kind) {
    case '(':
    case '[':
    case '{':
    case 'begin':
    case 'bar-open':
      return 1;
    case ')':
    case ']':
    case '}':
    case 'end-environment':
    case 'bar-close':
      return -1;
    default:
      return 0;
  }
}
