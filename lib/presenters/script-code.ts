import { createHash } from 'node:crypto';

const letters = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/**
 * What a student's work in a set is called while it is marked without names: a letter and four digits, the same on every
 * page of that set and different in the next, such as `K-1184`. It cannot be turned back into the student.
 */
export function scriptCode(problemSetId: string, studentId: string): string {
  const hash = createHash('sha256').update(`${problemSetId} ${studentId}`).digest();
  const letter = letters[hash.readUInt16BE(0) % letters.length] ?? 'A';
  return `${letter}-${String(hash.readUInt32BE(2) % 10_000).padStart(4, '0')}`;
}
