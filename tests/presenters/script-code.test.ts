import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { scriptCode } from '@/lib/presenters/script-code';

describe('the code of a script', () => {
  it('is a letter and four digits, the same each time', () => {
    fc.assert(
      fc.property(fc.uuid(), fc.uuid(), (set, student) => {
        expect(scriptCode(set, student)).toMatch(/^[A-HJ-NP-Z]-\d{4}$/);
        expect(scriptCode(set, student)).toBe(scriptCode(set, student));
      }),
    );
  });

  it('is another one in the next set', () => {
    const student = '6f1f3c7e-5a0e-4a3e-9b55-0f4d8a2f7c11';
    const codes = Array.from({ length: 20 }, (_, index) => scriptCode(`set ${index}`, student));
    expect(new Set(codes).size).toBeGreaterThan(18);
  });
});
