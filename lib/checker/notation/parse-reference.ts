/** Reference functions. The students' reader is built without this file. */
import { type Cursor } from './cursor';
import { parseArguments, refuseCount } from './parse-arguments';
import { fitsSlot, nameOfSlot, referenceSignatures } from './reference-functions';
import { type Token } from './token';
import { type Expression, type ReferenceName } from './tree';
import { listLength, nameOfType } from './typing';

/** reference = name `(` argument { `,` argument } `)`, each argument of the type that its place asks for */
export function parseReference(cursor: Cursor, token: Token, name: ReferenceName): Expression {
  const { slots, type } = referenceSignatures[name];
  const values = parseArguments(cursor, token, {
    before: (index) => {
      const slot = slots[index];
      cursor.stateExpected = slot === 'state' || slot === 'density';
    },
    after: (index, value) => {
      const slot = slots[index];
      if (slot === undefined || fitsSlot(slot, value.type, listLength(value))) return;
      const message = `Here ${nameOfSlot(slot)} is expected, not ${nameOfType(value.type)}.`;
      cursor.fail('bad-argument', value.span, message);
    },
  });
  if (values.length !== slots.length) refuseCount(cursor, token, slots.length);
  const span = { start: token.start, end: cursor.previous().end };
  return cursor.node({ node: 'reference', type, span, name, arguments: values });
}
