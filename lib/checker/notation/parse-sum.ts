/** Sums. */
import { type Cursor } from './cursor';
import { parseProduct } from './parse-product';
import { isSign, parseSign, parseSigned } from './parse-sign';
import { type Expression, type Term } from './tree';
import { listLength, sumType } from './typing';

/**
 * sum = term { sign term }
 * term = sign term | product
 */
export function parseSum(cursor: Cursor): Expression {
  const first = parseTerm(cursor);
  if (!isSign(cursor.peek())) return first;
  const { start } = first.span;
  const signed = first.node === 'sum' && first.terms.length === 1 ? first.terms[0] : undefined;
  const terms: Term[] = [signed ?? { sign: '+', body: first }];
  let type = first.type;
  while (isSign(cursor.peek())) {
    const sign = parseSign(cursor);
    const body = parseTerm(cursor);
    terms.push({ sign, body });
    const span = { start, end: body.span.end };
    type = cursor.typed(sumType(type, body.type), span);
    if (type === 'list' && listLength(first) !== listLength(body)) {
      cursor.fail('sum-type', span, 'Lists of different lengths cannot be added.');
    }
  }
  const end = terms[terms.length - 1]?.body.span.end ?? first.span.end;
  return cursor.node({ node: 'sum', type, span: { start, end }, terms });
}

function parseTerm(cursor: Cursor): Expression {
  return isSign(cursor.peek()) ? parseSigned(cursor, parseTerm) : parseProduct(cursor);
}
