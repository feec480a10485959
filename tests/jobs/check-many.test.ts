import { afterAll, describe, expect, it } from 'vitest';
import { checkMany } from '@/lib/jobs/check-many';
import { closeCheckerPool } from '@/lib/jobs/checker-pool';
import { checksAnswerSchema } from '@/lib/http-api/check-schemas';

afterAll(closeCheckerPool);

const outcomes = async (checks: readonly unknown[]) => (await checkMany(checks)).map(({ outcome }) => outcome);
const sum = (id: string, answer: string) => ({ id, kind: 'scalar', reference: '2', answer });

describe('many checks in threads', () => {
  it('come back in order over several chunks, and leave the event loop free', async () => {
    let turns = 0;
    const ticking = setInterval(() => (turns += 1), 5);
    const results = await outcomes(Array.from({ length: 240 }, (_, n) => sum(String(n), n % 2 ? '1 + 1' : '3')));
    clearInterval(ticking);
    expect(results.map(({ id }) => id)).toEqual(Array.from({ length: 240 }, (_, n) => String(n)));
    expect(results.map((one) => ('verdict' in one ? one.verdict : 'error'))).toEqual(
      Array.from({ length: 240 }, (_, n) => (n % 2 ? 'agrees' : 'differs')),
    );
    expect(turns).toBeGreaterThan(3);
  });

  it('have an error in the place of what is no check, with its line, and make the others', async () => {
    const results = await outcomes([
      null,
      sum('a', '2'),
      { ...sum('b', '2'), options: { wish: 1 } },
      sum('c', '2 +'),
      7,
    ]);
    expect(results).toMatchObject([
      { id: null, line: 1 },
      { id: 'a', verdict: 'agrees' },
      { id: 'b', line: 3 },
      { id: 'c', verdict: 'unreadable' },
      { id: null, line: 5 },
    ]);
    expect(checksAnswerSchema.safeParse({ results }).success).toBe(true);
  });

  it('have an error for a reference that cannot be read', async () => {
    const [result] = await outcomes([{ ...sum('a', '1'), reference: '1 +' }]);
    expect(result).toMatchObject({ id: 'a', line: 1 });
    expect(result).toHaveProperty('error');
  });

  it('survive inputs made to be costly', async () => {
    const deep = `${'('.repeat(1900)}1${')'.repeat(1900)}`;
    const long = Array.from({ length: 60 }, (_, n) => `sin(cos(x^${n} + sqrt(x^${n + 1} + 2)))`).join('*');
    const results = await outcomes([
      sum('deep', deep),
      { ...sum('long', long), reference: long.replace('2', '3'), symbols: { x: 'real' } },
      sum('after', '2'),
    ]);
    expect(results.map(({ id }) => id)).toEqual(['deep', 'long', 'after']);
    expect(results[0]).toMatchObject({ verdict: 'unreadable' });
    expect(results[2]).toMatchObject({ verdict: 'agrees' });
  });
});
