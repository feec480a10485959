import { describe, expect, it } from 'vitest';
import { hashPassword, newPasswordSchema, verifyPassword } from '@/lib/auth/password';

const password = 'slow neutron, cold beam';

async function milliseconds(work: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await work();
  return performance.now() - start;
}

describe('passwords', () => {
  it('are hashed by Argon2id with a salt of their own, and verified', async () => {
    const [one, two] = await Promise.all([hashPassword(password), hashPassword(password)]);
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(one).not.toBe(two);
    expect(await verifyPassword(one, password)).toBe(true);
    expect(await verifyPassword(one, `${password} `)).toBe(false);
  });

  it('verify whichever way an accented letter was composed', async () => {
    const stored = await hashPassword('caf\u00e9 au lait d\u00e9j\u00e0');
    expect(await verifyPassword(stored, 'cafe\u0301 au lait de\u0301ja\u0300')).toBe(true);
  });

  it('are false for no hash or a broken one', async () => {
    expect(await verifyPassword(null, password)).toBe(false);
    expect(await verifyPassword('not a hash', password)).toBe(false);
  });

  it('take about as long to refuse where there is no account', async () => {
    const stored = await hashPassword(password);
    await verifyPassword(null, 'warm up');
    const known: number[] = [];
    const unknown: number[] = [];
    for (let round = 0; round < 9; round += 1) {
      known.push(await milliseconds(() => verifyPassword(stored, 'wrong wrong wrong')));
      unknown.push(await milliseconds(() => verifyPassword(null, 'wrong wrong wrong')));
    }
    const median = (values: number[]) => values.toSorted((a, b) => a - b)[4] ?? Number.NaN;
    expect(median(unknown) / median(known)).toBeGreaterThan(0.5);
    expect(median(unknown) / median(known)).toBeLessThan(2);
  });

  it.each([
    ['elevenchars', false],
    ['twelve chars', true],
    ['aaaaaaaaaaaaaaaa', false],
    ['x'.repeat(201), false],
  ])('may be set or not: %j %s', (candidate, allowed) => {
    expect(newPasswordSchema.safeParse(candidate).success).toBe(allowed);
  });
});
